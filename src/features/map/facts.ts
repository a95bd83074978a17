import { arcsFor } from '@/core/arcs';
import { formatDistance } from '@/core/units';
import { formatBearing } from '@/features/ground/bearing-text';
import { degreesText } from '@/features/ground/place-text';
import { formatArcs, formatWinds } from '@/features/ground/view';
import { DIRECTION_WORDS, formatMonths } from '@/features/ground/words/kinds';
import { sizeOf, sizeText } from './drawing/measure';
import type { MapClub, MapThing } from './thing';
import { FACT_WORDS } from './words/facts';
import { whatOf } from './words/things';

export interface Fact {
  term: string;
  detail: string;
}

function standName(things: readonly MapThing[], id: string | null): string {
  return things.find((thing) => thing.id === id)?.name ?? '';
}

/** Everything the map shows of a thing, in words. */
export function factsOf(thing: MapThing, things: readonly MapThing[], club: MapClub): Fact[] {
  const size = sizeText(club, thing.geometry, club.units);
  const facts: Fact[] = [{ term: FACT_WORDS.kind, detail: whatOf(thing) }];
  if (thing.geometry.type === 'Point') {
    const [lon = 0, lat = 0] = thing.geometry.coordinates;
    facts.push({ term: FACT_WORDS.latitudeLongitude, detail: `${degreesText(lat)}, ${degreesText(lon)}` });
  } else facts.push({ term: FACT_WORDS.size, detail: size });
  switch (thing.kind) {
    case 'stand':
      facts.push(
        { term: FACT_WORDS.goodWindsMorning, detail: formatArcs(arcsFor(thing.arcs, 'morning')) },
        { term: FACT_WORDS.goodWindsEvening, detail: formatArcs(arcsFor(thing.arcs, 'evening')) },
      );
      if (thing.closed) facts.push({ term: FACT_WORDS.open, detail: thing.closed });
      break;
    case 'approach':
      facts.push(
        { term: FACT_WORDS.leadsTo, detail: standName(things, thing.standId) || FACT_WORDS.noStand },
        { term: FACT_WORDS.from, detail: standName(things, thing.parkingId) || FACT_WORDS.noParkingPlace },
        { term: FACT_WORDS.walked, detail: DIRECTION_WORDS[thing.direction] },
      );
      break;
    case 'feature':
      facts.push({ term: FACT_WORDS.months, detail: formatMonths(thing.months) });
      if (thing.crop) facts.push({ term: FACT_WORDS.cropThisYear, detail: thing.crop });
      break;
    case 'item':
      if (thing.props.cutYear) facts.push({ term: FACT_WORDS.timberCut, detail: String(thing.props.cutYear) });
      if (thing.props.facingDeg !== undefined) {
        facts.push({ term: FACT_WORDS.looks, detail: formatBearing(thing.props.facingDeg) });
      }
      if (thing.props.sector) {
        const { fromDeg, toDeg, reachM } = thing.props.sector;
        facts.push({
          term: FACT_WORDS.noShooting,
          detail: FACT_WORDS.noShoot(formatBearing(fromDeg), formatBearing(toDeg), formatDistance(reachM, club.units)),
        });
      }
      break;
  }
  return facts;
}

/** The same in a few words, for a row of the list. */
export function briefOf(thing: MapThing, things: readonly MapThing[], club: MapClub): string {
  const size = sizeOf(club, thing.geometry).lengthM > 0 ? sizeText(club, thing.geometry, club.units).split(',')[0] : '';
  const parts: (string | undefined)[] = [];
  switch (thing.kind) {
    case 'stand':
      parts.push(whatOf(thing), thing.arcs.length > 0 ? formatWinds(thing.arcs) : FACT_WORDS.noWinds, thing.closed);
      break;
    case 'parking':
      break;
    case 'approach': {
      const from = standName(things, thing.parkingId);
      parts.push(FACT_WORDS.to(standName(things, thing.standId)), from && FACT_WORDS.fromPlace(from), size);
      break;
    }
    case 'feature':
      parts.push(
        whatOf(thing),
        thing.crop ?? undefined,
        size,
        thing.months.length < 12 ? formatMonths(thing.months) : '',
      );
      break;
    case 'item':
      parts.push(thing.name ? whatOf(thing) : '', thing.props.cutYear ? FACT_WORDS.cut(thing.props.cutYear) : '', size);
      break;
  }
  return parts.filter(Boolean).join(', ');
}
