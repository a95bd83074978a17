'use client';

import { WINDOW_NAMES } from '@/core/condition-types';
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
import {
  MOMENT_COST_WORDS as COSTS,
  MOMENT_FACT_WORDS as FACTS,
  MOMENT_SUN_WORDS,
  MOMENT_WINDOWS,
  MOMENT_WORDS as WORDS,
} from '../words';

export interface MomentPanelProps {
  ask: MomentAsk;
  stands: { id: string; name: string }[];
  club: { zone: string; units: Units };
  view: MomentView | undefined;
  error: string | null;
  onAsk: (ask: MomentAsk) => void;
  onRetry: () => void;
}

const percent = (share: number) => `${Math.round(share * 100)} %`;

function windText(wind: MomentView['wind'], units: Units): string {
  if (!wind) return FACTS.noWind;
  const from =
    wind.fromDeg === null ? FACTS.noDirection : FACTS.from(sectorName(wind.fromDeg), Math.round(wind.fromDeg) % 360);
  return wind.speedMps === null ? from : FACTS.atSeat(from, formatSpeed(wind.speedMps, units));
}

function sunText({ altitudeDeg, azimuthDeg, inEyes }: MomentView['sun']): string {
  if (altitudeDeg < -6) return MOMENT_SUN_WORDS.night;
  if (altitudeDeg < 0) return MOMENT_SUN_WORDS.twilight(sectorName(azimuthDeg));
  return MOMENT_SUN_WORDS.up(sectorName(azimuthDeg), Math.round(altitudeDeg), inEyes);
}

function Costs({ view, units }: { view: MomentView; units: Units }) {
  if (!view.way) return <p>{COSTS.noWay}</p>;
  const runs = costlyRuns(view.way.stretches).slice(0, 4);
  return (
    <>
      <p>{COSTS.way(view.way.name, percent(view.way.inChance))}</p>
      {runs.length === 0 ? (
        <p className="text-ink-soft">{COSTS.even}</p>
      ) : (
        <ul className="list-disc pl-5">
          {runs.map((run) => (
            <li key={run.startM}>
              {COSTS.run(
                formatDistance(run.startM, units),
                formatDistance(run.endM, units),
                percent(run.chance),
                run.worst,
              )}
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
          term: FACTS.wind,
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
          term: FACTS.scent,
          detail: view.winded ? FACTS.winded(percent(view.winded.chance), view.winded.most) : FACTS.notKnown,
        },
        { term: FACTS.sun, detail: sunText(view.sun) },
        { term: FACTS.walk, detail: <Costs view={view} units={club.units} /> },
        {
          term: FACTS.sitters,
          detail:
            view.sitters.length === 0
              ? FACTS.nobody
              : view.sitters.map((sitter) => FACTS.sits(sitter.name, sitter.standName)).join(', '),
        },
      ]
    : [];
  return (
    <div className="grid gap-4">
      <Select
        label={WORDS.stand}
        options={stands.map(({ id, name }) => ({ value: id, label: name }))}
        value={ask.stand}
        onChange={({ target }) => onAsk({ ...ask, stand: target.value, step: 0 })}
      />
      <div className="grid grid-cols-2 gap-2">
        <DateInput
          label={WORDS.day}
          value={ask.day}
          onChange={({ target }) => target.value && onAsk({ ...ask, day: target.value, step: 0 })}
        />
        <Select
          label={WORDS.window}
          value={ask.window}
          options={WINDOW_NAMES.map((value) => ({ value, label: MOMENT_WINDOWS[value] }))}
          onChange={({ target }) => {
            const window = WINDOW_NAMES.find((one) => one === target.value);
            if (window) onAsk({ ...ask, window, step: 0 });
          }}
        />
      </div>
      <div className="flex gap-2">
        <Button look="quiet" onClick={() => onAsk({ ...ask, day: addDays(ask.day, -1), step: 0 })}>
          {WORDS.dayBefore}
        </Button>
        <Button look="quiet" onClick={() => onAsk({ ...ask, day: addDays(ask.day, 1), step: 0 })}>
          {WORDS.dayAfter}
        </Button>
      </div>
      <label className="block">
        <span className="font-semibold">{WORDS.halfHour(spoken)}</span>
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
        label={WORDS.orChoose}
        value={String(step)}
        options={steps.map((at, i) => ({ value: String(i), label: clock(at) }))}
        onChange={({ target }) => onAsk({ ...ask, step: Number(target.value) })}
      />
      {error && (
        <ErrorState title={WORDS.failed} action={<Button onClick={onRetry}>{WORDS.again}</Button>}>
          {error}
        </ErrorState>
      )}
      {!view && !error && <Loading label={WORDS.working} />}
      {view && !view.wind && (
        <Notice level="caution" title={WORDS.noForecastTitle}>
          {WORDS.noForecast(formatDay(view.window.day))}
        </Notice>
      )}
      {view && (
        <div aria-live="polite">
          <DefinitionList items={facts} />
          <p className="mt-2 text-ink-soft text-sm">{WORDS.legend}</p>
        </div>
      )}
    </div>
  );
}
