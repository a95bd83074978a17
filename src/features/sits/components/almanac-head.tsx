import type { ReactNode } from 'react';
import type { SitsView } from '../view-types';
import { clockText } from '../words';

interface Entry {
  term: string;
  value: ReactNode;
}

/** The hour the sun rises or sets, whichever the window leans on. */
function sunEntry({ sky, window, club }: SitsView): Entry {
  if (sky.polar !== 'none') return { term: 'Sun', value: sky.polar === 'up_all_day' ? 'up all day' : 'down all day' };
  const at = window.window === 'morning' ? sky.rise : sky.set;
  const term = window.window === 'morning' ? 'Sunrise' : 'Sunset';
  return { term, value: at === null ? '–' : clockText(at, club) };
}

/** What a person before dawn wants of the almanac, in a few words: for a phone. */
export function AlmanacLine({ view }: { view: SitsView }) {
  const { club, window, weather, light } = view;
  const clock = (at: number) => clockText(at, club);
  const sun = sunEntry(view);
  const parts = [
    `${clock(window.startAt)} – ${clock(window.endAt)}`,
    `${sun.term.toLowerCase()} ${sun.value}`,
    ...(weather ? [weather.wind, weather.air] : []),
  ];
  const edge = light && (window.window === 'morning' ? `from ${clock(light.startAt)}` : `until ${clock(light.endAt)}`);
  return (
    <p className="border-rule-strong border-y py-2 leading-snug sm:hidden">
      {parts.join(' · ')}
      {edge && <span className="block text-ink-soft text-sm">Light {edge} by the club's rule. State law decides.</span>}
    </p>
  );
}

/** The day's figures as an almanac sets them: sun, window, wind, air, moon. */
export function AlmanacHead({ view }: { view: SitsView }) {
  const { club, sky, window, weather, light } = view;
  const clock = (at: number | null) => (at === null ? '–' : clockText(at, club));
  const morning = window.window === 'morning';
  const entries: Entry[] = [
    { term: 'Window', value: `${clock(window.startAt)} – ${clock(window.endAt)}` },
    sunEntry(view),
    morning
      ? { term: 'First light', value: clock(sky.civilDawn) }
      : { term: 'Last light', value: clock(sky.civilDusk) },
    ...(weather
      ? [
          { term: 'Wind', value: weather.wind },
          { term: 'Air', value: weather.air },
          ...(weather.barometer ? [{ term: 'Barometer', value: weather.barometer }] : []),
        ]
      : []),
    { term: 'Moon', value: sky.moon },
  ];
  return (
    <div className="mt-5">
      <dl className="grid grid-cols-2 gap-x-5 border-rule-strong border-y py-1 sm:grid-cols-3 lg:grid-cols-4">
        {entries.map(({ term, value }) => (
          <div key={term} className="py-1.5">
            <dt className="small-caps text-ink-soft text-sm leading-tight">{term}</dt>
            <dd className="leading-snug">{value}</dd>
          </div>
        ))}
      </dl>
      {light && (
        <p className="mt-2 max-w-prose text-ink-soft text-sm">
          <span className="text-ink">
            {morning ? `Light from ${clock(light.startAt)}.` : `Light until ${clock(light.endAt)}.`}
          </span>{' '}
          {light.text}
        </p>
      )}
    </div>
  );
}
