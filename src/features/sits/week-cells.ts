import type { WeekCell, WeekColumnView, WeekView } from './view-types';

export const WEEK_SHOWS = ['all', 'open', 'mine'] as const;
export type WeekShow = (typeof WEEK_SHOWS)[number];

export const WEEK_SHOW_LABELS: Record<WeekShow, string> = { all: 'All stands', open: 'Open stands', mine: 'My sits' };

export function isShown(cell: WeekCell, show: WeekShow): boolean {
  return show === 'all' || (show === 'open' ? cell.open && !cell.mine : cell.mine);
}

/** A column's cells, the best first, those a filter keeps. */
export function rankedCells(column: WeekColumnView, show: WeekShow): WeekCell[] {
  const byStand = new Map(column.cells.map((cell) => [cell.standId, cell]));
  return column.order.flatMap((id) => byStand.get(id) ?? []).filter((cell) => isShown(cell, show));
}

/** Stands with something to show in any window. */
export function shownStands(view: WeekView, show: WeekShow): WeekView['stands'] {
  return view.stands.filter(({ standId }) =>
    view.columns.some((column) => column.cells.some((cell) => cell.standId === standId && isShown(cell, show))),
  );
}

/** Columns that follow each other on one day. */
export function groupByDay(columns: WeekColumnView[]): { day: string; columns: WeekColumnView[] }[] {
  const days: { day: string; columns: WeekColumnView[] }[] = [];
  for (const column of columns) {
    const last = days.at(-1);
    if (last?.day === column.window.day) last.columns.push(column);
    else days.push({ day: column.window.day, columns: [column] });
  }
  return days;
}

/** What the strip of a cell shows, in words. */
export function cellText(cell: WeekCell): string {
  if (!cell.open && cell.gate) return `not open: ${cell.gate}`;
  if (cell.strip === null) return 'no forecast';
  return cell.hold === null ? 'no good winds set' : `wind in its arcs ${Math.round(cell.hold * 100)} % of the sit`;
}
