import type { WeekCell, WeekColumnView, WeekView } from './view-types';
import { WEEK_CELL_WORDS as WORDS } from './words/week';

export const WEEK_SHOWS = ['all', 'open', 'mine'] as const;
export type WeekShow = (typeof WEEK_SHOWS)[number];

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

export interface WeekDay {
  day: string;
  dayText: string;
  columns: WeekColumnView[];
}

/** Columns that follow each other on one day. */
export function groupByDay(columns: WeekColumnView[]): WeekDay[] {
  const days: WeekDay[] = [];
  for (const column of columns) {
    const last = days.at(-1);
    if (last?.day === column.window.day) last.columns.push(column);
    else days.push({ day: column.window.day, dayText: column.dayText, columns: [column] });
  }
  return days;
}

/** What the strip of a cell shows, in words. */
export function cellText(cell: WeekCell): string {
  if (!cell.open && cell.gate) return WORDS.notOpen(cell.gate);
  if (cell.strip === null) return WORDS.noForecast;
  return cell.hold === null ? WORDS.noWinds : WORDS.hold(Math.round(cell.hold * 100));
}
