import { arcsFor } from '@/core/arcs';
import { WEAPONS } from '@/core/types';
import { formatDistance, formatHeight, type Units } from '@/core/units';
import { type Definition, DefinitionList, Section } from '@/ui/page-parts';
import { CompassMark } from '@/ui/wind/compass-mark';
import { formatBearing } from '../bearing-text';
import { degreesText } from '../place-text';
import type { StandRow } from '../stands-data';
import { formatArcs } from '../view';
import { SHELTER_WORDS, SHOT_SIDE_WORDS, STAND_KIND_WORDS, SUITABILITY_WORDS, WEAPON_WORDS } from '../words';
import { ArcBars } from './arc-bars';

export function GoodWinds({ stand }: { stand: StandRow }) {
  return (
    <Section title="Good winds" note="Where the wind may come from, from true north.">
      <div className="grid gap-6 sm:grid-cols-2">
        {(['morning', 'evening'] as const).map((window) => (
          <div key={window}>
            <h3 className="font-semibold">
              {window === 'morning' ? 'Morning' : 'Evening'}: {SUITABILITY_WORDS[stand[window]].toLowerCase()}
            </h3>
            <ArcBars arcs={arcsFor(stand.arcs, window)} className="my-1 h-auto w-full max-w-md" />
            <p>{formatArcs(arcsFor(stand.arcs, window))}</p>
          </div>
        ))}
      </div>
    </Section>
  );
}

function facing(stand: StandRow): Definition {
  if (stand.facingDeg === null) return { term: 'Faces', detail: 'No one way' };
  return {
    term: 'Faces',
    detail: (
      <span className="inline-flex items-center gap-2">
        <span aria-hidden="true">
          <CompassMark bearingDeg={stand.facingDeg} />
        </span>
        {formatBearing(stand.facingDeg)}
      </span>
    ),
  };
}

export interface StandFactsProps {
  stand: StandRow;
  units: Units;
  restDaysDefault: number;
  /** null: every member. */
  allowedNames: string[] | null;
}

export function StandFacts({ stand, units, restDaysDefault, allowedNames }: StandFactsProps) {
  const shots = WEAPONS.flatMap((weapon) => {
    const range = stand.shotRangeM[weapon];
    return range === undefined ? [] : [`${WEAPON_WORDS[weapon]} to ${formatDistance(range, units)}`];
  });
  const seat: Definition[] = [
    { term: 'Kind', detail: STAND_KIND_WORDS[stand.kind] },
    { term: 'Latitude, longitude', detail: `${degreesText(stand.lat)}, ${degreesText(stand.lon)}` },
    { term: 'Seat height', detail: formatHeight(stand.seatHeightM, units) },
    { term: 'Seats', detail: stand.seats },
    facing(stand),
    { term: 'Shot side', detail: SHOT_SIDE_WORDS[stand.shotSide] },
    { term: 'Longest shot', detail: shots.length === 0 ? 'No weapon is allowed' : shots.join(', ') },
  ];
  const drain = stand.drainBearingDeg === null ? 'Not known' : `Toward ${formatBearing(stand.drainBearingDeg)}`;
  const use: Definition[] = [
    { term: 'Rest after a sit', detail: days(stand.restDays ?? restDaysDefault, stand.restDays === null) },
    { term: 'Most sits a season', detail: stand.mostSitsSeason ?? 'No limit' },
    {
      term: 'Who may hunt it',
      detail: allowedNames === null ? 'Everyone who hunts' : allowedNames.join(', ') || 'Nobody',
    },
    { term: 'Shelter', detail: SHELTER_WORDS[stand.shelter] },
    { term: 'Cold air drains', detail: drain },
    { term: 'Slope', detail: stand.slopePercent === null ? 'Not known' : `${stand.slopePercent} %` },
  ];
  return (
    <Section title="Facts">
      <div className="grid gap-x-10 lg:grid-cols-2">
        <DefinitionList items={seat} className="self-start" />
        <DefinitionList items={use} className="self-start border-t-0 lg:border-t" />
      </div>
    </Section>
  );
}

function days(count: number, byDefault: boolean): string {
  const text = `${count} full day${count === 1 ? '' : 's'}`;
  return byDefault ? `${text}, the club's default` : text;
}
