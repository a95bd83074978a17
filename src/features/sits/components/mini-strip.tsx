import type { Arc } from '@/core/ground-types';
import { shadePaths } from '@/ui/wind/strip-drawing';
import { unrollArcs } from '@/ui/wind/strip-shares';

const WIDTH = 72;
const xOf = (deg: number) => (deg / 360) * WIDTH;

/** The wind strip without its letters, for a cell of a table that says the same in words. `thousandths`: 72 shares x 1000. */
export function MiniStrip({ arcs, thousandths }: { arcs: Arc[]; thousandths: number[] | null }) {
  const shares = thousandths?.map((one) => one / 1000);
  return (
    <svg
      viewBox={`0 0 ${WIDTH} 13`}
      width={WIDTH}
      height={13}
      aria-hidden="true"
      className="block print:h-auto print:w-full"
    >
      {shares ? (
        shadePaths(shares, xOf, 0, 8).map(({ level, opacity, d }) => (
          <path key={level} d={d} fill="var(--color-ink)" fillOpacity={opacity} />
        ))
      ) : (
        <path d={`M0 4H${WIDTH}`} stroke="var(--color-ink-soft)" strokeDasharray="1 4" />
      )}
      <path d={`M0 10.5H${WIDTH}`} stroke="var(--color-ink)" strokeWidth={0.75} />
      {unrollArcs(arcs).map(({ from, to }) => (
        <rect
          key={from}
          x={xOf(from)}
          y={9}
          width={Math.max(1.5, xOf(to) - xOf(from))}
          height={3}
          fill="var(--color-moss)"
        />
      ))}
    </svg>
  );
}
