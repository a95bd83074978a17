import type { Arc } from '@/core/ground-types';
import { round, shadePaths } from './strip-drawing';
import { describeWindStrip, mergeRows, type StripRow, unrollArcs } from './strip-shares';
import { WindStripPage } from './wind-strip-page';

export interface WindStripProps {
  /** The stand's good-wind arcs for this window. */
  arcs: Arc[];
  /** One row a step of the sit, in time order. */
  rows: StripRow[];
  /** `line`: all steps in one row of 160 x 24 px. `page`: a row a step with its clock time. */
  variant?: 'line' | 'page';
  /** Clock label of a step in the club's zone; needed for `page`. */
  formatClock?: (at: number) => string;
  className?: string;
}

/** The compass unrolled along a line, N E S W N: bars are the good arcs, shading above is where the wind is expected from. */
export function WindStrip({ arcs, rows, variant = 'line', formatClock, className }: WindStripProps) {
  if (variant === 'page') {
    return <WindStripPage arcs={arcs} rows={rows} formatClock={formatClock} className={className} />;
  }
  return <WindStripLine arcs={arcs} rows={rows} className={className} />;
}

const WIDTH = 160;
const LEFT = 5;
const SPAN = WIDTH - 2 * LEFT;
const xOf = (deg: number) => LEFT + (deg / 360) * SPAN;

/** One text whose letters each have their own place: a list has many strips. */
const QUARTERS = 'NESWN';
const QUARTERS_AT = [0, 90, 180, 270, 360].map(xOf).join(' ');

function WindStripLine({ arcs, rows, className }: { arcs: Arc[]; rows: StripRow[]; className?: string }) {
  const text = describeWindStrip({ arcs, rows });
  const shares = mergeRows(rows)?.shares;
  return (
    <svg viewBox={`0 0 ${WIDTH} 24`} width={WIDTH} height={24} role="img" aria-label={text} className={className}>
      <title>{text}</title>
      {shares ? (
        shadePaths(shares, xOf, 0, 10).map(({ level, opacity, d }) => (
          <path key={level} d={d} fill="var(--color-ink)" fillOpacity={opacity} />
        ))
      ) : (
        <path d={`M${LEFT} 5H${WIDTH - LEFT}`} stroke="var(--color-ink-soft)" strokeDasharray="1 4" fill="none" />
      )}
      <path d={`M${LEFT} 13H${WIDTH - LEFT}`} stroke="var(--color-ink)" strokeWidth={0.75} fill="none" />
      {unrollArcs(arcs).map(({ from, to }) => (
        <rect
          key={from}
          x={round(xOf(from))}
          y={11}
          width={round(Math.max(1.5, xOf(to) - xOf(from)))}
          height={4}
          fill="var(--color-moss)"
        />
      ))}
      <text x={QUARTERS_AT} y={23} fontSize={8} fontWeight={600} textAnchor="middle" fill="var(--color-ink-soft)">
        {QUARTERS}
      </text>
    </svg>
  );
}
