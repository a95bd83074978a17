import { joinClasses } from '../join-classes';
import { TIMELINE_WORDS as WORDS } from '../words/wind';
import { describeTimeline, isWet, type TimelineSpan, windedLine } from './describe-timeline';
import { percent } from './strip-shares';

export interface SitTimelineProps {
  /** Half hours of the sit in time order. */
  steps: readonly TimelineSpan[];
  /** Clock label in the club's zone. */
  formatClock: (at: number) => string;
  /** Moments to mark, as sunrise. */
  marks?: readonly { at: number; label: string }[];
  className?: string;
}

const SCALE = ['100 %', '50', '0'];

/** A sit's half hours: the bar's height is the wind's share in the good arcs, the line the chance of being winded. */
export function SitTimeline({ steps, formatClock, marks = [], className }: SitTimelineProps) {
  const first = steps[0];
  const stepMs = (steps[1]?.at ?? 0) - (first?.at ?? 0);
  const placed = marks
    .map((mark) => ({ ...mark, left: first && stepMs > 0 ? (mark.at - first.at) / stepMs / steps.length : -1 }))
    .filter((mark) => mark.left >= 0 && mark.left <= 1);
  return (
    <figure className={joinClasses('text-sm', className)}>
      <div className={joinClasses('grid beside gap-x-2', placed.length > 0 ? 'pt-5' : 'pt-1')}>
        <div
          aria-hidden="true"
          className="flex h-28 flex-col justify-between text-right text-ink-soft text-xs leading-none"
        >
          {SCALE.map((mark) => (
            <span key={mark}>{mark}</span>
          ))}
        </div>
        <div role="img" aria-label={describeTimeline(steps, formatClock)} className="relative">
          <Plot steps={steps} />
          {placed.map((mark) => (
            <div
              key={mark.label}
              className="absolute -top-4 h-32 border-ink border-l border-dotted"
              style={{ left: `${mark.left * 100}%` }}
            >
              <span
                className={joinClasses(
                  '-top-1 absolute whitespace-nowrap text-xs leading-tight',
                  mark.left > 0.7 ? 'right-1.5' : 'left-1',
                )}
              >
                {mark.label}
              </span>
            </div>
          ))}
          <Feet steps={steps} formatClock={formatClock} />
        </div>
      </div>
      <Key steps={steps} />
      <TimelineTable steps={steps} formatClock={formatClock} />
    </figure>
  );
}

function Plot({ steps }: { steps: readonly TimelineSpan[] }) {
  return (
    <div className="relative h-28">
      <svg
        viewBox={`0 0 ${steps.length} 100`}
        preserveAspectRatio="none"
        className="absolute inset-0 size-full"
        aria-hidden="true"
      >
        <path
          d={`M0 0H${steps.length}M0 50H${steps.length}`}
          stroke="var(--color-rule)"
          vectorEffect="non-scaling-stroke"
        />
        {steps.map((step, index) => {
          if (step.arcHold === null) return null;
          const top = Math.round((1 - step.arcHold) * 1000) / 10;
          return (
            <g key={step.at}>
              <rect
                x={index + 0.04}
                y={top}
                width={0.92}
                height={100 - top}
                fill="var(--color-ink)"
                fillOpacity={0.16}
              />
              <path
                d={`M${index + 0.04} ${top}h0.92`}
                stroke="var(--color-ink)"
                strokeWidth={3}
                vectorEffect="non-scaling-stroke"
              />
            </g>
          );
        })}
        <path
          d={`M0 100H${steps.length}`}
          stroke="var(--color-ink)"
          strokeWidth={2}
          vectorEffect="non-scaling-stroke"
        />
        <path
          d={windedLine(steps)}
          stroke="var(--color-clay)"
          strokeWidth={2}
          fill="none"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
      {steps.map((step, index) =>
        step.windedChance === null ? null : (
          <span
            key={step.at}
            aria-hidden="true"
            className="absolute size-1.5 -translate-1/2 rounded-full bg-clay"
            style={{ left: `${((index + 0.5) / steps.length) * 100}%`, top: `${(1 - step.windedChance) * 100}%` }}
          />
        ),
      )}
    </div>
  );
}

/** Sun and rain marks and every second clock time. */
function Feet({ steps, formatClock }: { steps: readonly TimelineSpan[]; formatClock: (at: number) => string }) {
  const every = steps.length > 8 ? 4 : 2;
  return (
    <div aria-hidden="true" className="flex">
      {steps.map((step, index) => (
        <div key={step.at} className="relative flex h-10 flex-1 flex-col items-center">
          <span className="flex h-5 items-center gap-px">
            {step.sunInEyes && <SunSign />}
            {isWet(step) && <RainSign />}
          </span>
          {index % every === 0 && (
            <span className="absolute top-5 left-0 whitespace-nowrap border-rule-strong border-l pl-0.5 text-ink-soft text-xs">
              {formatClock(step.at)}
            </span>
          )}
        </div>
      ))}
    </div>
  );
}

function SunSign() {
  return (
    <svg viewBox="-7 -7 14 14" className="size-3.5 shrink-0" aria-hidden="true">
      <circle r={2.6} fill="none" stroke="currentColor" strokeWidth={1.4} />
      <path
        d="M0 -6.5V-4.2M0 4.2V6.5M-6.5 0H-4.2M4.2 0H6.5M-4.6 -4.6L-3 -3M3 3L4.6 4.6M-4.6 4.6L-3 3M3 -3L4.6 -4.6"
        stroke="currentColor"
        strokeWidth={1.4}
      />
    </svg>
  );
}

function RainSign() {
  return (
    <svg viewBox="0 0 10 12" className="h-3.5 w-3 shrink-0" aria-hidden="true">
      <path d="M3 1L1 5M7 1L5 5M5 7L3 11M9 7L7 11" stroke="currentColor" strokeWidth={1.4} strokeLinecap="round" />
    </svg>
  );
}

function Key({ steps }: { steps: readonly TimelineSpan[] }) {
  return (
    <figcaption className="mt-1 flex flex-wrap gap-x-4 gap-y-0.5 text-ink-soft">
      <span className="flex items-center gap-1.5">
        <span aria-hidden="true" className="inline-block h-3 w-4 border-ink border-t-3 bg-ink/15" />
        {WORDS.keyArcs}
      </span>
      <span className="flex items-center gap-1.5">
        <span aria-hidden="true" className="inline-flex h-0.5 w-5 items-center justify-center bg-clay">
          <span className="size-1.5 rounded-full bg-clay" />
        </span>
        {WORDS.keyWinded}
      </span>
      {steps.some((step) => step.sunInEyes) && (
        <span className="flex items-center gap-1">
          <SunSign /> {WORDS.keySun}
        </span>
      )}
      {steps.some(isWet) && (
        <span className="flex items-center gap-1">
          <RainSign /> {WORDS.keyRain}
        </span>
      )}
    </figcaption>
  );
}

function TimelineTable({
  steps,
  formatClock,
}: {
  steps: readonly TimelineSpan[];
  formatClock: (at: number) => string;
}) {
  const share = (value: number | null) => (value === null ? '–' : percent(value));
  return (
    <details className="mt-1">
      <summary className="inline-block min-h-11 py-2.5 underline decoration-rule-strong underline-offset-4">
        {WORDS.asTable}
      </summary>
      <table className="w-full border-collapse">
        <thead>
          <tr className="border-rule-strong border-b text-left align-bottom">
            <th scope="col">{WORDS.time}</th>
            <th scope="col">{WORDS.inArcs}</th>
            <th scope="col">{WORDS.windedHead}</th>
            <th scope="col">{WORDS.notes}</th>
          </tr>
        </thead>
        <tbody className="divide-y divide-rule">
          {steps.map((step) => (
            <tr key={step.at} className="align-top">
              <th scope="row" className="text-left font-normal">
                {formatClock(step.at)}
              </th>
              <td>{share(step.arcHold)}</td>
              <td>{share(step.windedChance)}</td>
              <td>
                {[step.sunInEyes && WORDS.keySun, isWet(step) && WORDS.rainMm(step.precipMm), step.note]
                  .filter(Boolean)
                  .join('; ')}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
