import type { ReactNode } from 'react';
import type { SitsView } from '../view-types';
import { ALMANAC_WORDS as WORDS } from '../words/list';
import { clockText } from '../words/terms';

interface Entry {
  term: string;
  value: ReactNode;
}

/** The hour the sun rises or sets, whichever the window leans on. */
function sunEntry({ sky, window, club }: SitsView): Entry {
  if (sky.polar !== 'none') {
    return { term: WORDS.sun, value: sky.polar === 'up_all_day' ? WORDS.upAllDay : WORDS.downAllDay };
  }
  const at = window.window === 'morning' ? sky.rise : sky.set;
  const term = window.window === 'morning' ? WORDS.sunrise : WORDS.sunset;
  return { term, value: at === null ? WORDS.unknown : clockText(at, club) };
}

/** What a person before dawn wants of the almanac, in a few words: for a phone. */
export function AlmanacLine({ view }: { view: SitsView }) {
  const { club, window, weather, light } = view;
  const clock = (at: number) => clockText(at, club);
  const sun = sunEntry(view);
  const parts = [
    WORDS.span(clock(window.startAt), clock(window.endAt)),
    `${sun.term.toLowerCase()} ${sun.value}`,
    ...(weather ? [weather.wind, weather.air] : []),
  ];
  const edge =
    light &&
    (window.window === 'morning'
      ? WORDS.lightFromRule(clock(light.startAt))
      : WORDS.lightUntilRule(clock(light.endAt)));
  return (
    <p className="border-rule-strong border-y py-2 leading-snug sm:hidden">
      {parts.join(' · ')}
      {edge && <span className="block text-ink-soft text-sm">{edge}</span>}
    </p>
  );
}

/** The day's figures as an almanac sets them: sun, window, wind, air, moon. */
export function AlmanacHead({ view }: { view: SitsView }) {
  const { club, sky, window, weather, light } = view;
  const clock = (at: number | null) => (at === null ? WORDS.unknown : clockText(at, club));
  const morning = window.window === 'morning';
  const entries: Entry[] = [
    { term: WORDS.window, value: WORDS.span(clock(window.startAt), clock(window.endAt)) },
    sunEntry(view),
    morning
      ? { term: WORDS.firstLight, value: clock(sky.civilDawn) }
      : { term: WORDS.lastLight, value: clock(sky.civilDusk) },
    ...(weather
      ? [
          { term: WORDS.wind, value: weather.wind },
          { term: WORDS.air, value: weather.air },
          ...(weather.barometer ? [{ term: WORDS.barometer, value: weather.barometer }] : []),
        ]
      : []),
    { term: WORDS.moon, value: sky.moon },
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
            {morning ? WORDS.lightFrom(clock(light.startAt)) : WORDS.lightUntil(clock(light.endAt))}
          </span>{' '}
          {light.text}
        </p>
      )}
    </div>
  );
}
