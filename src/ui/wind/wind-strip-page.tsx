import type { Arc } from '@/core/ground-types';
import { joinClasses } from '../join-classes';
import { STRIP_PAGE_WORDS } from '../words/wind';
import { round, shadePaths } from './strip-drawing';
import { describeWindStrip, holdOf, percent, type StripRow, settledName, unrollArcs } from './strip-shares';

export interface WindStripPageProps {
  arcs: Arc[];
  rows: StripRow[];
  formatClock?: (at: number) => string;
  className?: string;
}

const LETTERS = ['N', 'E', 'S', 'W', 'N'];
const QUARTERS = [90, 180, 270];
const HEIGHT = 20;

/** Hours and minutes of the instant in UTC, for when no clock is given. */
function utcClock(at: number): string {
  return STRIP_PAGE_WORDS.utc(new Date(at).toISOString().slice(11, 16));
}

/** The strip as a table: a row a step, its clock time before it and its share in the good arcs after it. */
export function WindStripPage({ arcs, rows, formatClock = utcClock, className }: WindStripPageProps) {
  const spans = unrollArcs(arcs);
  return (
    <table className={joinClasses('w-full table-fixed border-collapse text-sm', className)}>
      <caption className="pb-1 text-left text-ink-soft">{describeWindStrip({ arcs, rows })}</caption>
      <colgroup>
        <col className="w-16" />
        <col />
        <col className="w-14" />
      </colgroup>
      <thead className="sr-only">
        <tr>
          <th scope="col">{STRIP_PAGE_WORDS.time}</th>
          <th scope="col">{STRIP_PAGE_WORDS.windFrom}</th>
          <th scope="col">{STRIP_PAGE_WORDS.inArcs}</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <StripTableRow key={row.at} row={row} arcs={arcs} spans={spans} clock={formatClock(row.at)} />
        ))}
      </tbody>
      <tfoot>
        <tr>
          <td />
          <td className="px-2 pt-px">
            <svg viewBox="0 0 360 8" preserveAspectRatio="none" className="block h-2 w-full" aria-hidden="true">
              <path d="M0 4H360" stroke="var(--color-ink)" vectorEffect="non-scaling-stroke" fill="none" />
              {spans.map(({ from, to }) => (
                <rect key={from} x={from} width={Math.max(2, to - from)} height={8} fill="var(--color-moss)" />
              ))}
            </svg>
            <span aria-hidden="true" className="relative block h-5 font-semibold">
              {LETTERS.map((letter, quarter) => (
                <span
                  // biome-ignore lint/suspicious/noArrayIndexKey: N stands at both ends
                  key={quarter}
                  className="absolute -translate-x-1/2"
                  style={{ left: `${quarter * 25}%` }}
                >
                  {letter}
                </span>
              ))}
            </span>
          </td>
          <td className="text-right align-top text-ink-soft text-xs">
            <span aria-hidden="true">{STRIP_PAGE_WORDS.inArcsShort}</span>
          </td>
        </tr>
      </tfoot>
    </table>
  );
}

interface RowProps {
  row: StripRow;
  arcs: Arc[];
  spans: { from: number; to: number }[];
  clock: string;
}

function StripTableRow({ row, arcs, spans, clock }: RowProps) {
  const hold = arcs.length > 0 ? holdOf(row, arcs) : null;
  const name = settledName(row.shares);
  return (
    <tr className="border-paper border-b">
      <th scope="row" className="text-right font-normal">
        {clock}
      </th>
      <td className="px-2 py-0">
        <span className="sr-only">
          {row.shares ? (name ?? STRIP_PAGE_WORDS.unsettled) : STRIP_PAGE_WORDS.noForecast}
        </span>
        <svg
          viewBox={`0 0 360 ${HEIGHT}`}
          preserveAspectRatio="none"
          className="block h-5.5 w-full bg-panel"
          aria-hidden="true"
        >
          {row.shares ? (
            shadePaths(row.shares, round, 0, HEIGHT).map(({ level, opacity, d }) => (
              <path key={level} d={d} fill="var(--color-ink)" fillOpacity={opacity} />
            ))
          ) : (
            <path
              d={`M0 ${HEIGHT / 2}H360`}
              stroke="var(--color-ink-soft)"
              strokeDasharray="1 5"
              vectorEffect="non-scaling-stroke"
              fill="none"
            />
          )}
          <path
            d={QUARTERS.map((x) => `M${x} 0v${HEIGHT}`).join('')}
            stroke="var(--color-rule)"
            vectorEffect="non-scaling-stroke"
            fill="none"
          />
          <path
            d={spans.map(({ from, to }) => `M${from} 0v${HEIGHT}M${to} 0v${HEIGHT}`).join('')}
            stroke="var(--color-moss)"
            strokeWidth={1.5}
            vectorEffect="non-scaling-stroke"
            fill="none"
          />
        </svg>
      </td>
      <td className="text-right">{hold === null ? '–' : percent(hold)}</td>
    </tr>
  );
}
