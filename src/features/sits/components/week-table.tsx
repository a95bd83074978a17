import { Button } from '@/ui/button';
import { joinClasses } from '@/ui/join-classes';
import { Link } from '@/ui/link';
import { useMoreRows } from '@/ui/use-more-rows';
import { sitAddress } from '../sit-address';
import type { WeekCell, WeekColumnView, WeekView } from '../view-types';
import { cellText, groupByDay, isShown, shownStands, type WeekShow } from '../week-cells';
import { WINDOW_WORDS } from '../words/names';
import { WEEK_TABLE_WORDS as WORDS } from '../words/week';
import { MiniStrip } from './mini-strip';

/** A screen or three of them: more would be slow to draw on a phone. */
const ROWS_AT_ONCE = 60;
/** Days, and windows below them. */
const HEAD_ROWS = 2;

/** Stands down, windows across: each cell says the word, the score and where the wind lies. */
export function WeekTable({ view, show }: { view: WeekView; show: WeekShow }) {
  const days = groupByDay(view.columns);
  const stands = shownStands(view, show);
  const { shown, foot, showAll } = useMoreRows(stands.length, ROWS_AT_ONCE);
  return (
    <table className="week-table border-collapse text-sm" aria-rowcount={stands.length + HEAD_ROWS}>
      <caption className="sr-only">{WORDS.caption}</caption>
      <thead>
        <tr>
          <th
            scope="col"
            rowSpan={2}
            className="sticky left-0 z-10 min-w-36 bg-paper print:min-w-0 pr-3 text-left align-bottom"
          >
            {WORDS.stand}
          </th>
          {days.map(({ day, dayText, columns }) => (
            <th
              key={day}
              scope="colgroup"
              colSpan={columns.length}
              className="border-rule-strong border-l px-2 text-left font-serif text-base"
            >
              {dayText}
            </th>
          ))}
        </tr>
        <tr className="border-rule-strong border-b">
          {view.columns.map(({ window, dayText }) => (
            <th
              key={`${window.day} ${window.window}`}
              scope="col"
              className={joinClasses(
                'px-2 pb-1 text-left font-normal',
                window.window === 'morning' && 'border-rule-strong border-l',
              )}
            >
              <Link
                className="rounded-sm underline decoration-rule-strong underline-offset-4"
                href={sitAddress(view.club.slug, { day: window.day, window: window.window })}
              >
                {WINDOW_WORDS[window.window]}
                <span className="sr-only">{WORDS.ofDay(dayText)}</span>
              </Link>
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {stands.slice(0, shown).map((stand) => (
          <tr key={stand.standId} className="border-rule border-b align-top">
            <th scope="row" className="sticky left-0 z-10 bg-paper py-1.5 pr-3 text-left font-semibold">
              {stand.name}
            </th>
            {view.columns.map((column) => (
              <td
                key={`${column.window.day} ${column.window.window}`}
                className={joinClasses('p-0', column.window.window === 'morning' && 'border-rule border-l')}
              >
                <Cell view={view} column={column} stand={stand} show={show} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
      {shown < stands.length && (
        <tfoot ref={foot}>
          <tr>
            <td colSpan={1 + view.columns.length} className="py-3">
              <Button onClick={showAll}>{WORDS.showAll(stands.length)}</Button>
            </td>
          </tr>
        </tfoot>
      )}
    </table>
  );
}

interface CellProps {
  view: WeekView;
  column: WeekColumnView;
  stand: WeekView['stands'][number];
  show: WeekShow;
}

function Cell({ view, column, stand, show }: CellProps) {
  const cell = column.cells.find((one) => one.standId === stand.standId);
  if (!cell || !isShown(cell, show)) return null;
  const { day, window } = column.window;
  const ask = { day, window, ...(view.weapon ? { weapon: view.weapon } : {}), stand: stand.standId };
  return (
    <Link href={sitAddress(view.club.slug, ask)} className="block px-2 py-1.5 no-underline hover:bg-panel">
      <CellWords cell={cell} />
      <MiniStrip bars={stand.bars[window]} shades={cell.strip === null ? null : (view.strips[cell.strip] ?? null)} />
      <span className="sr-only">{cellText(cell)}</span>
    </Link>
  );
}

function CellWords({ cell }: { cell: WeekCell }) {
  if (cell.mine) return <span className="block whitespace-nowrap font-semibold">{WORDS.yourSit}</span>;
  if (!cell.open) return <span className="block whitespace-nowrap text-ink-soft italic">{WORDS.notOpen}</span>;
  return (
    <span className={joinClasses('flex justify-between gap-2', cell.word === 'Quiet' && 'font-semibold')}>
      {cell.word} <span>{Math.round(cell.score)}</span>
    </span>
  );
}
