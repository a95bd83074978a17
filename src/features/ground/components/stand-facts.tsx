import { arcsFor } from '@/core/arcs';
import { WEAPONS } from '@/core/ground-types';
import { formatDistance, formatHeight, type Units } from '@/core/units';
import { type Definition, DefinitionList, Section } from '@/ui/page-parts';
import { CompassMark } from '@/ui/wind/compass-mark';
import { formatBearing } from '../bearing-text';
import { degreesText } from '../place-text';
import type { StandRow } from '../stands-data';
import { formatArcs } from '../view';
import { SHELTER_WORDS, SHOT_SIDE_WORDS, STAND_KIND_WORDS, SUITABILITY_WORDS, WEAPON_WORDS } from '../words/kinds';
import { STAND_FACTS_WORDS } from '../words/stand';
import { ArcBars } from './arc-bars';

export function GoodWinds({ stand }: { stand: StandRow }) {
  return (
    <Section title={STAND_FACTS_WORDS.goodWinds} note={STAND_FACTS_WORDS.goodWindsNote}>
      <div className="grid gap-6 sm:grid-cols-2">
        {(['morning', 'evening'] as const).map((window) => (
          <div key={window}>
            <h3 className="font-semibold">
              {window === 'morning' ? STAND_FACTS_WORDS.morning : STAND_FACTS_WORDS.evening}:{' '}
              {SUITABILITY_WORDS[stand[window]].toLowerCase()}
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
  if (stand.facingDeg === null) return { term: STAND_FACTS_WORDS.faces, detail: STAND_FACTS_WORDS.noOneWay };
  return {
    term: STAND_FACTS_WORDS.faces,
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
    return range === undefined ? [] : [STAND_FACTS_WORDS.shot(WEAPON_WORDS[weapon], formatDistance(range, units))];
  });
  const seat: Definition[] = [
    { term: STAND_FACTS_WORDS.kind, detail: STAND_KIND_WORDS[stand.kind] },
    { term: STAND_FACTS_WORDS.latitudeLongitude, detail: `${degreesText(stand.lat)}, ${degreesText(stand.lon)}` },
    { term: STAND_FACTS_WORDS.seatHeight, detail: formatHeight(stand.seatHeightM, units) },
    { term: STAND_FACTS_WORDS.seats, detail: stand.seats },
    facing(stand),
    { term: STAND_FACTS_WORDS.shotSide, detail: SHOT_SIDE_WORDS[stand.shotSide] },
    {
      term: STAND_FACTS_WORDS.longestShot,
      detail: shots.length === 0 ? STAND_FACTS_WORDS.noWeaponAllowed : shots.join(', '),
    },
  ];
  const drain =
    stand.drainBearingDeg === null
      ? STAND_FACTS_WORDS.notKnown
      : STAND_FACTS_WORDS.toward(formatBearing(stand.drainBearingDeg));
  const use: Definition[] = [
    { term: STAND_FACTS_WORDS.restAfterSit, detail: days(stand.restDays ?? restDaysDefault, stand.restDays === null) },
    { term: STAND_FACTS_WORDS.mostSitsSeason, detail: stand.mostSitsSeason ?? STAND_FACTS_WORDS.noLimit },
    {
      term: STAND_FACTS_WORDS.whoHunt,
      detail:
        allowedNames === null
          ? STAND_FACTS_WORDS.everyoneWhoHunts
          : allowedNames.join(', ') || STAND_FACTS_WORDS.nobody,
    },
    { term: STAND_FACTS_WORDS.shelter, detail: SHELTER_WORDS[stand.shelter] },
    { term: STAND_FACTS_WORDS.coldAirDrains, detail: drain },
    {
      term: STAND_FACTS_WORDS.slope,
      detail: stand.slopePercent === null ? STAND_FACTS_WORDS.notKnown : `${stand.slopePercent} %`,
    },
  ];
  return (
    <Section title={STAND_FACTS_WORDS.facts}>
      <div className="grid gap-x-10 lg:grid-cols-2">
        <DefinitionList items={seat} className="self-start" />
        <DefinitionList items={use} className="self-start border-t-0 lg:border-t" />
      </div>
    </Section>
  );
}

function days(count: number, byDefault: boolean): string {
  return byDefault ? STAND_FACTS_WORDS.defaultDays(count) : STAND_FACTS_WORDS.days(count);
}
