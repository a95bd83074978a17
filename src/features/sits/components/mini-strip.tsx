import { MINI_STRIP } from '../mini-strip-size';
import type { StripBar, StripShade } from '../view-types';

const { width, height, shade, line, bar } = MINI_STRIP;

/** The wind strip without its letters, for a cell of a table that says the same in words. `shades`: null without a forecast. */
export function MiniStrip({ bars, shades }: { bars: StripBar[]; shades: StripShade[] | null }) {
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      aria-hidden="true"
      className="block print:h-auto print:w-full"
    >
      {shades ? (
        shades.map(({ opacity, d }) => <path key={opacity} d={d} fill="var(--color-ink)" fillOpacity={opacity} />)
      ) : (
        <path d={`M0 ${shade / 2}H${width}`} stroke="var(--color-ink-soft)" strokeDasharray="1 4" />
      )}
      <path d={`M0 ${line}H${width}`} stroke="var(--color-ink)" strokeWidth={0.75} />
      {bars.map(({ x, width: long }) => (
        <rect key={x} x={x} y={bar} width={long} height={3} fill="var(--color-moss)" />
      ))}
    </svg>
  );
}
