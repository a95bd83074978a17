'use client';

import { WINDOW_NAMES, type WindowName } from '@/core/condition-types';
import { addDays, formatClock, formatClock12, formatDay } from '@/core/day-time';
import { sectorName } from '@/core/sectors';
import { formatDistance, formatSpeed, type Units } from '@/core/units';
import { Button } from '@/ui/button';
import { ErrorState, Loading, Notice } from '@/ui/notices';
import { type Definition, DefinitionList } from '@/ui/page-parts';
import { DateInput, Select } from '@/ui/text-inputs';
import { CompassMark } from '@/ui/wind/compass-mark';
import type { MomentAsk } from '../ask-moment';
import type { MomentView } from '../moment-types';
import { costlyRuns } from '../stretch-view';

export interface MomentPanelProps {
  ask: MomentAsk;
  stands: { id: string; name: string }[];
  club: { zone: string; units: Units };
  view: MomentView | undefined;
  error: string | null;
  onAsk: (ask: MomentAsk) => void;
  onRetry: () => void;
}

const WINDOW_WORDS: Record<WindowName, string> = { morning: 'Morning', evening: 'Evening' };
const percent = (share: number) => `${Math.round(share * 100)} %`;

function windText(wind: MomentView['wind'], units: Units): string {
  if (!wind) return 'No forecast reaches this half hour';
  const from =
    wind.fromDeg === null
      ? 'From no one direction'
      : `From ${sectorName(wind.fromDeg)}, ${Math.round(wind.fromDeg) % 360}°`;
  return wind.speedMps === null ? from : `${from}, ${formatSpeed(wind.speedMps, units)} at the seat`;
}

function sunText({ altitudeDeg, azimuthDeg, inEyes }: MomentView['sun']): string {
  if (altitudeDeg < -6) return 'Down: night';
  if (altitudeDeg < 0) return `Down: twilight in the ${sectorName(azimuthDeg)}`;
  return `In the ${sectorName(azimuthDeg)}, ${Math.round(altitudeDeg)}° up${inEyes ? ', in your eyes' : ''}`;
}

function Costs({ view, units }: { view: MomentView; units: Units }) {
  if (!view.way) return <p>No way in is drawn for this stand.</p>;
  const runs = costlyRuns(view.way.stretches).slice(0, 4);
  return (
    <>
      <p>
        {view.way.name}: {percent(view.way.inChance)} to alert deer walking in.
      </p>
      {runs.length === 0 ? (
        <p className="text-ink-soft">No piece of it costs more than another.</p>
      ) : (
        <ul className="list-disc pl-5">
          {runs.map((run) => (
            <li key={run.startM}>
              {formatDistance(run.startM, units)} to {formatDistance(run.endM, units)} in: {percent(run.chance)}
              {run.worst && `, at ${run.worst}`}
            </li>
          ))}
        </ul>
      )}
    </>
  );
}

/** A stand, a day and an hour chosen, and in words what the map then shows. */
export function MomentPanel({ ask, stands, club, view, error, onAsk, onRetry }: MomentPanelProps) {
  const clock = (at: number) => (club.units === 'us' ? formatClock12(at, club.zone) : formatClock(at, club.zone));
  const steps = view?.steps ?? [];
  const step = Math.min(ask.step, Math.max(0, steps.length - 1));
  const spoken = steps[step] === undefined ? '' : clock(steps[step]);
  const facts: Definition[] = view
    ? [
        {
          term: 'Wind',
          detail: (
            <span className="inline-flex items-center gap-2">
              {view.wind?.fromDeg != null && (
                <span aria-hidden="true">
                  <CompassMark bearingDeg={(view.wind.fromDeg + 180) % 360} />
                </span>
              )}
              {windText(view.wind, club.units)}
            </span>
          ),
        },
        {
          term: 'Scent',
          detail: view.winded
            ? `${percent(view.winded.chance)} to be winded in this half hour${view.winded.most ? `, most at ${view.winded.most}` : ''}`
            : 'Not known',
        },
        { term: 'Sun', detail: sunText(view.sun) },
        { term: 'Walk in', detail: <Costs view={view} units={club.units} /> },
        {
          term: 'Who sits',
          detail:
            view.sitters.length === 0
              ? 'Nobody has booked this window'
              : view.sitters.map((sitter) => `${sitter.name} at ${sitter.standName}`).join(', '),
        },
      ]
    : [];
  return (
    <div className="grid gap-4">
      <Select
        label="Stand"
        options={stands.map(({ id, name }) => ({ value: id, label: name }))}
        value={ask.stand}
        onChange={({ target }) => onAsk({ ...ask, stand: target.value, step: 0 })}
      />
      <div className="grid grid-cols-2 gap-2">
        <DateInput
          label="Day"
          value={ask.day}
          onChange={({ target }) => target.value && onAsk({ ...ask, day: target.value, step: 0 })}
        />
        <Select
          label="Window"
          value={ask.window}
          options={WINDOW_NAMES.map((value) => ({ value, label: WINDOW_WORDS[value] }))}
          onChange={({ target }) => {
            const window = WINDOW_NAMES.find((one) => one === target.value);
            if (window) onAsk({ ...ask, window, step: 0 });
          }}
        />
      </div>
      <div className="flex gap-2">
        <Button look="quiet" onClick={() => onAsk({ ...ask, day: addDays(ask.day, -1), step: 0 })}>
          ‹ Day before
        </Button>
        <Button look="quiet" onClick={() => onAsk({ ...ask, day: addDays(ask.day, 1), step: 0 })}>
          Day after ›
        </Button>
      </div>
      <label className="block">
        <span className="font-semibold">Half hour from {spoken || 'the start'}</span>
        <input
          type="range"
          className="mt-1 block h-11 w-full accent-moss"
          min={0}
          max={Math.max(0, steps.length - 1)}
          step={1}
          value={step}
          aria-valuetext={spoken}
          onChange={({ target }) => onAsk({ ...ask, step: Number(target.value) })}
        />
      </label>
      <Select
        label="Or choose the time"
        value={String(step)}
        options={steps.map((at, i) => ({ value: String(i), label: clock(at) }))}
        onChange={({ target }) => onAsk({ ...ask, step: Number(target.value) })}
      />
      {error && (
        <ErrorState title="This moment could not be read" action={<Button onClick={onRetry}>Try again</Button>}>
          {error}
        </ErrorState>
      )}
      {!view && !error && <Loading label="Working it out" />}
      {view && !view.wind && (
        <Notice level="caution" title="No forecast">
          Scent is not drawn for {formatDay(view.window.day)}: the forecast does not reach it.
        </Notice>
      )}
      {view && (
        <div aria-live="polite">
          <DefinitionList items={facts} />
          <p className="mt-2 text-ink-soft text-sm">
            Clay shading is where your scent would lie, the deeper the stronger: an index for comparing, no promise. The
            walk is thicker where it costs more. The dashed line points at the sun.
          </p>
        </div>
      )}
    </div>
  );
}
