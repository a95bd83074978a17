import type { Weapon } from '@/core/ground-types';
import { mToFt, mToYd, type Units } from '@/core/units';
import { numberText } from '@/features/clubs/read-number';
import { arcText } from './arc-text';
import { bearingText } from './bearing-text';
import { degreesText } from './place-text';
import type { StandForm } from './stand-schema';
import type { StandValues } from './stands-data';

/** What a form for a new stand begins with. */
export function emptyStandForm(): StandForm {
  return {
    name: '',
    kind: 'ladder',
    lat: '',
    lon: '',
    seatHeight: '',
    facing: '',
    shotSide: 'either',
    shotRange: { bow: '', crossbow: '', muzzleloader: '', shotgun: '', rifle: '' },
    shelter: 'open_wood',
    seats: '1',
    arcsBoth: '',
    arcsMorning: '',
    arcsEvening: '',
    morning: 'usable',
    evening: 'usable',
    restDays: '',
    mostSitsSeason: '',
    drainBearing: '',
    slopePercent: '',
    whoMayHunt: 'everyone',
    allowedMemberIds: [],
    notes: '',
  };
}

/** A stored stand as its form holds it. */
export function standFormOf(stand: StandValues, units: Units): StandForm {
  const range = (weapon: Weapon) => {
    const m = stand.shotRangeM[weapon] ?? null;
    return numberText(m !== null && units === 'us' ? mToYd(m) : m, 1);
  };
  return {
    name: stand.name,
    kind: stand.kind,
    lat: degreesText(stand.lat),
    lon: degreesText(stand.lon),
    seatHeight: numberText(units === 'us' ? mToFt(stand.seatHeightM) : stand.seatHeightM, 1),
    facing: bearingText(stand.facingDeg),
    shotSide: stand.shotSide,
    shotRange: {
      bow: range('bow'),
      crossbow: range('crossbow'),
      muzzleloader: range('muzzleloader'),
      shotgun: range('shotgun'),
      rifle: range('rifle'),
    },
    shelter: stand.shelter,
    seats: String(stand.seats),
    arcsBoth: arcText(stand.arcs, null),
    arcsMorning: arcText(stand.arcs, 'morning'),
    arcsEvening: arcText(stand.arcs, 'evening'),
    morning: stand.morning,
    evening: stand.evening,
    restDays: numberText(stand.restDays),
    mostSitsSeason: numberText(stand.mostSitsSeason),
    drainBearing: bearingText(stand.drainBearingDeg),
    slopePercent: numberText(stand.slopePercent),
    whoMayHunt: stand.allowedMemberIds === null ? 'everyone' : 'named',
    allowedMemberIds: stand.allowedMemberIds ?? [],
    notes: stand.notes,
  };
}
