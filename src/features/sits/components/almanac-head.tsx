import type { ReactNode } from 'react';
import type { SitsView } from '../view-types';
import { clockText } from '../words';

interface Entry {
  term: string;
  value: ReactNode;
}

/** The day's figures as an almanac sets them: sun, window, wind, air, moon. */
export function AlmanacHead({ view }: { view: SitsView }) {
  const { club, sky, window, weather, light } = view;
  const clock = (at: number | null) => (at === null ? '–' : clockText(at, club));
  const morning = window.window === 'morning';
  const sun: Entry[] =
    sky.polar === 'none'
      ? [morning ? { term: 'Sunrise', value: clock(sky.rise) } : { term: 'Sunset', value: clock(sky.set) }]
      : [{ term: 'Sun', value: sky.polar === 'up_all_day' ? 'up all day' : 'down all day' }];
  const entries: Entry[] = [
    { term: 'Window', value: `${clock(window.startAt)} – ${clock(window.endAt)}` },
    ...sun,
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
          <div key={term} className="border-rule border-b py-1.5 last:border-b-0">
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
