import { scaleLinear } from 'd3-scale';
import { joinClasses } from '../join-classes';
import { CHART_WORDS } from '../words/tables';

export interface RangeRow {
  key: string;
  label: string;
  /** null: nothing can be said. */
  range: { value: number; low: number; high: number } | null;
  /** At the right of the bar: the figure, or why there is none. */
  text: string;
  note?: string;
}

export interface RangeChartProps {
  title: string;
  /** What is measured along the foot. */
  unit: string;
  rows: readonly RangeRow[];
  className?: string;
}

const TICKS = 4;
/** Whiskers of groups with hardly any hours would squeeze all others: they run off the edge. */
const WHISKER_ROOM = 2.5;

/** The end of the axis, and its ticks, for some rows. Kept apart so that it can be tested. */
export function rangeScale(rows: readonly RangeRow[]) {
  const ranges = rows.flatMap((row) => row.range ?? []);
  const widest = Math.max(0, ...ranges.map((range) => range.high));
  const tallest = Math.max(0, ...ranges.map((range) => range.value));
  const end = tallest > 0 ? Math.min(widest, tallest * WHISKER_ROOM) : widest;
  const scale = scaleLinear([0, end || 1], [0, 100])
    .nice(TICKS)
    .clamp(true);
  return { scale, ticks: scale.ticks(TICKS), tickText: scale.tickFormat(TICKS) };
}

/**
 * Bars along one axis, each with its 95 % interval as a line. A picture beside a table that says the same: to a screen
 * reader it is its title alone.
 */
export function RangeChart({ title, unit, rows, className }: RangeChartProps) {
  const { scale, ticks, tickText } = rangeScale(rows);
  return (
    <figure className={className}>
      <figcaption className="mb-2 text-ink-soft text-sm">{CHART_WORDS.legend(title, unit)}</figcaption>
      <div role="img" aria-label={CHART_WORDS.name(title)}>
        <div className="flex flex-col gap-2 sm:gap-1" aria-hidden="true">
          {rows.map((row) => (
            <div key={row.key} className="chart-row sm:items-center print:items-center">
              <span className="truncate text-sm">
                {row.label} {row.note && <span className="text-ink-soft">{row.note}</span>}
              </span>
              <span className="text-right text-sm sm:order-last print:order-last">{row.text}</span>
              <Track
                row={row}
                at={scale}
                ticks={ticks}
                className="col-span-2 h-4 sm:col-span-1 sm:h-6 print:col-span-1"
              />
            </div>
          ))}
          <div className="chart-axis">
            <div className="relative h-5 text-ink-soft text-xs sm:col-start-2 print:col-start-2">
              {ticks.map((tick) => (
                <span
                  key={tick}
                  className={joinClasses(
                    'absolute',
                    scale(tick) === 0 ? '' : scale(tick) >= 99 ? '-translate-x-full' : '-translate-x-1/2',
                  )}
                  style={{ left: `${scale(tick)}%` }}
                >
                  {tickText(tick)}
                </span>
              ))}
            </div>
          </div>
        </div>
      </div>
    </figure>
  );
}

interface TrackProps {
  row: RangeRow;
  at: (value: number) => number;
  ticks: number[];
  className: string;
}

function Track({ row: { range }, at, ticks, className }: TrackProps) {
  return (
    <svg
      viewBox="0 0 100 20"
      preserveAspectRatio="none"
      className={joinClasses('w-full', className)}
      aria-hidden="true"
    >
      {ticks.map((tick) => (
        <line
          key={tick}
          x1={at(tick)}
          x2={at(tick)}
          y1={0}
          y2={20}
          className="stroke-rule"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {range && (
        <>
          <rect x={0} y={4} width={at(range.value)} height={12} className="fill-moss" opacity={0.45} />
          <line
            x1={at(range.low)}
            x2={at(range.high)}
            y1={10}
            y2={10}
            className="stroke-ink"
            strokeWidth={2}
            vectorEffect="non-scaling-stroke"
          />
          <line
            x1={at(range.value)}
            x2={at(range.value)}
            y1={4}
            y2={16}
            className="stroke-ink"
            strokeWidth={3}
            vectorEffect="non-scaling-stroke"
          />
        </>
      )}
    </svg>
  );
}
