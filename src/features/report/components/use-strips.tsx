import { scaleLinear } from 'd3-scale';
import type { UsePart, UseRow } from '../parts/use';
import { USE_WORDS as words } from '../words/use';

const TALL = 40;
/** Room for a line at its top, and a hair between bars; in units of the drawing. */
const TOP = 2;
const GAP = 0.8;

/** Stand by stand along one line of days: bars for sits in a week, a line for the pressure of each day. */
export function UseStrips({ use }: { use: UsePart }) {
  const mostSits = Math.max(1, ...use.rows.flatMap(({ byWeek }) => byWeek));
  const mostPressure = Math.max(1, ...use.rows.map(({ peakPressure }) => peakPressure));
  const bar = scaleLinear([0, mostSits], [TALL, TOP]);
  const line = scaleLinear([0, mostPressure], [TALL, TOP]);
  const wide = use.weeks.length * 7;
  const months = use.weeks
    .flatMap(({ fromDay }, index) => {
      const before = use.weeks[index - 1]?.fromDay;
      return before?.slice(0, 7) === fromDay.slice(0, 7) ? [] : [{ at: index * 7, day: fromDay }];
    })
    // Two names that begin a few days apart would stand on each other.
    .filter(({ at }, index, all) => (all[index + 1]?.at ?? wide + 14) - at >= 14 || at > 0);
  return (
    <figure className="mb-6">
      <figcaption className="mb-2 max-w-prose text-ink-soft text-sm">
        {words.chart} {words.key(mostSits, mostPressure)}
      </figcaption>
      <div role="img" aria-label={words.chartLabel}>
        <div aria-hidden="true" className="flex flex-col gap-2 sm:gap-1">
          {use.rows.map((row) => (
            <div key={row.standId} className="chart-row break-inside-avoid sm:items-end print:items-end">
              <span className="truncate text-sm">{row.gone ? words.gone(row.name) : row.name}</span>
              <span className="text-right text-sm sm:order-last print:order-last">{words.sits(row.sits)}</span>
              <Strip
                row={row}
                wide={wide}
                months={months.map(({ at }) => at)}
                bar={bar}
                line={line}
                className="col-span-2 h-10 w-full sm:order-none sm:col-span-1 print:order-none print:col-span-1 print:h-7"
              />
            </div>
          ))}
          <div className="chart-axis">
            <div className="relative h-5 text-ink-soft text-xs sm:col-start-2 print:col-start-2">
              {months.map(({ at, day }) => (
                <span key={day} className="absolute" style={{ left: `${(100 * at) / wide}%` }}>
                  {words.month(day)}
                </span>
              ))}
            </div>
          </div>
        </div>
      </div>
    </figure>
  );
}

interface StripProps {
  row: UseRow;
  wide: number;
  months: number[];
  bar: (sits: number) => number;
  line: (pressure: number) => number;
  className: string;
}

function Strip({ row, wide, months, bar, line, className }: StripProps) {
  const bars = row.byWeek
    .map((sits, week) => (sits === 0 ? '' : `M${week * 7 + GAP / 2},${TALL}V${bar(sits)}h${7 - GAP}V${TALL}z`))
    .join('');
  const points = row.pressure.map((pressure, day) => `${day},${line(pressure).toFixed(1)}`).join(' ');
  return (
    <svg viewBox={`0 0 ${wide} ${TALL}`} preserveAspectRatio="none" className={className} aria-hidden="true">
      {months.map((at) => (
        <line key={at} x1={at} x2={at} y1={0} y2={TALL} className="stroke-rule" vectorEffect="non-scaling-stroke" />
      ))}
      <path d={bars} className="fill-moss" opacity={0.45} />
      <line x1={0} x2={wide} y1={TALL} y2={TALL} className="stroke-rule-strong" vectorEffect="non-scaling-stroke" />
      <polyline
        points={points}
        fill="none"
        className="stroke-ink"
        strokeWidth={1.5}
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}
