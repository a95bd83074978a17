import { TextLink } from '@/ui/button';
import { Link } from '@/ui/link';
import { sitAddress } from '../sit-address';
import type { WeekColumnView, WeekView } from '../view-types';
import { cellText, groupByDay, rankedCells, type WeekShow } from '../week-cells';
import { WINDOW_WORDS } from '../words/names';
import { WEEK_DAYS_WORDS as WORDS } from '../words/week';
import { MiniStrip } from './mini-strip';
import { WordMark } from './word-mark';

/** On a phone a window names its best few; the rest are one tap away. */
const BEST = 4;

export function WeekDays({ view, show }: { view: WeekView; show: WeekShow }) {
  return (
    <div>
      {groupByDay(view.columns).map(({ day, dayText, columns }) => (
        <section key={day} aria-label={dayText} className="mt-6 first:mt-0">
          <h2 className="border-rule-strong border-b font-serif text-xl">{dayText}</h2>
          {columns.map((column) => (
            <WindowList key={column.window.window} view={view} column={column} show={show} />
          ))}
        </section>
      ))}
    </div>
  );
}

function WindowList({ view, column, show }: { view: WeekView; column: WeekColumnView; show: WeekShow }) {
  const { day, window } = column.window;
  const cells = rankedCells(column, show);
  const told = show === 'all' ? cells.filter((cell) => cell.open) : cells;
  const best = told.slice(0, BEST);
  const weapon = view.weapon ? { weapon: view.weapon } : {};
  return (
    <div className="pt-2">
      <h3 className="flex items-baseline justify-between">
        <span className="small-caps text-ink-soft">{WINDOW_WORDS[window]}</span>
        <TextLink className="py-2 text-sm" href={sitAddress(view.club.slug, { day, window, ...weapon })}>
          {WORDS.list}
          <span className="sr-only">{WORDS.listOf(column.dayText, WINDOW_WORDS[window])}</span>
        </TextLink>
      </h3>
      {best.length === 0 && <p className="pb-2 text-ink-soft">{show === 'mine' ? WORDS.noSit : WORDS.noneOpen}</p>}
      <ol>
        {best.map((cell) => {
          const stand = view.stands.find(({ standId }) => standId === cell.standId);
          return (
            <li key={cell.standId} className="border-rule border-t">
              <Link
                href={sitAddress(view.club.slug, { day, window, ...weapon, stand: cell.standId })}
                className="flex min-h-11 items-center justify-between gap-3 py-1.5"
              >
                <span className="min-w-0">{cell.mine ? WORDS.yours(stand?.name ?? '') : stand?.name}</span>
                <span className="flex shrink-0 items-center gap-3">
                  <MiniStrip
                    bars={stand?.bars[window] ?? []}
                    shades={cell.strip === null ? null : (view.strips[cell.strip] ?? null)}
                  />
                  <span className="sr-only">{cellText(cell)}</span>
                  <span className="w-18 text-right">
                    <WordMark word={cell.word} />
                  </span>
                </span>
              </Link>
            </li>
          );
        })}
      </ol>
      {told.length > BEST && <p className="pb-1 text-ink-soft text-sm">{WORDS.more(told.length - BEST)}</p>}
    </div>
  );
}
