import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ApproachForm, approachFormOf, emptyApproachForm, makeApproachSchema } from './approach-schema';
import { closureSchema } from './closure-schema';
import { emptyFeatureForm, featureFormOf, makeFeatureSchema } from './feature-schema';
import { makeParkingSchema, parkingFormOf } from './parking-schema';
import { emptyStandForm, standFormOf } from './stand-form';
import { makeStandSchema, type StandForm } from './stand-schema';

const us = { lat: 38.6, lon: -83.2, units: 'us' as const };
const metric = { ...us, units: 'metric' as const };

const typed: StandForm = {
  ...emptyStandForm(),
  name: '  Creek   Bend ',
  lat: '38.605',
  lon: '-83.195',
  seatHeight: '15',
  facing: 'NE',
  shotRange: { ...emptyStandForm().shotRange, bow: '30' },
  arcsBoth: 'NW-N',
  arcsEvening: '200-230',
  restDays: '4',
};

/** Message by field of a form that is refused. */
function faults(result: { success: boolean; error?: { issues: { path: PropertyKey[]; message: string }[] } }) {
  return Object.fromEntries((result.error?.issues ?? []).map((i) => [i.path.join('.'), i.message]));
}

describe('stand form', () => {
  it('turns feet and yards into metres', () => {
    const stand = makeStandSchema(us).parse(typed);
    // International Yard and Pound, 1959: 1 ft = 0.3048 m, 1 yd = 0.9144 m.
    expect(stand.seatHeightM).toBeCloseTo(4.572, 9);
    expect(stand.shotRangeM).toEqual({ bow: 27.432 });
    expect(stand.name).toBe('Creek Bend');
    expect(stand.arcs).toEqual([
      { fromDeg: 303.75, toDeg: 11.25, window: null },
      { fromDeg: 200, toDeg: 230, window: 'evening' },
    ]);
    expect(stand).toMatchObject({ facingDeg: 45, restDays: 4, mostSitsSeason: null, allowedMemberIds: null });
  });

  it('takes metres as they stand in a metric club', () => {
    const stand = makeStandSchema(metric).parse({ ...typed, seatHeight: '4,5' });
    expect(stand).toMatchObject({ seatHeightM: 4.5, shotRangeM: { bow: 30 } });
  });

  it('says every mistake beside its field, all at once', () => {
    const bad = makeStandSchema(us).safeParse({
      ...typed,
      name: ' ',
      lat: '-83.195',
      lon: '38.605',
      seatHeight: '',
      facing: 'up',
      shotRange: { bow: '', crossbow: '', muzzleloader: '', shotgun: '', rifle: '' },
      seats: '1.5',
      arcsMorning: 'NW-NORF',
      restDays: '-1',
      whoMayHunt: 'named',
    });
    const found = faults(bad);
    expect(Object.keys(found).sort()).toEqual(
      [
        'allowedMemberIds',
        'arcsMorning',
        'facing',
        'lat',
        'name',
        'restDays',
        'seatHeight',
        'seats',
        'shotRange.bow',
      ].sort(),
    );
    expect(found.lat).toMatch(/swap/);
    expect(found.seats).toMatch(/whole number from 1 to 8/);
  });

  it('comes back from the form a stored stand is shown in', () => {
    const tenths = (max: number) => fc.integer({ min: 10, max: max * 10 }).map((n) => String(n / 10));
    fc.assert(
      fc.property(
        fc.constantFrom(us, metric),
        tenths(15),
        tenths(500),
        fc.integer({ min: 0, max: 359 }),
        fc.constantFrom('NW-N', 'any', '310-20, S', ''),
        (club, seatHeight, rifle, facing, arcsMorning) => {
          const schema = makeStandSchema(club);
          const form = {
            ...typed,
            seatHeight,
            facing: String(facing),
            shotRange: { ...typed.shotRange, rifle },
            arcsMorning,
          };
          const stand = schema.parse(form);
          expect(schema.parse(standFormOf(stand, club.units))).toEqual(stand);
        },
      ),
    );
  });
});

describe('feature and parking forms', () => {
  it('come back from what is stored', () => {
    const feature = makeFeatureSchema(us).parse({
      ...emptyFeatureForm(),
      name: 'Laurel beds',
      months: ['11', '9', '11'],
      places: '38.60, -83.20\n38.61, -83.20\n38.61, -83.19',
    });
    expect(feature.months).toEqual([9, 11]);
    expect(makeFeatureSchema(us).parse(featureFormOf(feature))).toEqual(feature);
    const parking = makeParkingSchema(us).parse({ name: 'Creek Gate', lat: '38.6', lon: '83.2 W', notes: 'two cars' });
    expect(parking).toEqual({ name: 'Creek Gate', lat: 38.6, lon: -83.2, notes: 'two cars' });
    expect(makeParkingSchema(us).parse(parkingFormOf(parking))).toEqual(parking);
  });

  it('a feature needs a name, a month and a place', () => {
    const found = faults(makeFeatureSchema(us).safeParse({ ...emptyFeatureForm(), months: [] }));
    expect(Object.keys(found).sort()).toEqual(['months', 'name', 'places']);
    expect(faults(makeFeatureSchema(us).safeParse({ ...emptyFeatureForm(), months: ['13'] })).months).toMatch(
      /1 to 12/,
    );
  });
});

describe('approach form', () => {
  const places = {
    stand: { name: 'Creek Bend', lat: 38.605, lon: -83.195 },
    parkings: [{ id: 'prk_1', name: 'Creek Gate', lat: 38.6, lon: -83.2 }],
  };
  const schema = makeApproachSchema(us, places);
  const form = (set: Partial<ApproachForm>): ApproachForm => ({ ...emptyApproachForm(), name: 'Creek path', ...set });

  it('walks straight from the parking place where nothing is typed', () => {
    expect(schema.parse(form({ parkingId: 'prk_1' })).points).toEqual([
      [-83.2, 38.6],
      [-83.195, 38.605],
    ]);
    expect(faults(schema.safeParse(form({}))).points).toMatch(/parking place/);
  });

  it('sets the ends, counts what is driven and comes back the same', () => {
    const read = schema.parse(form({ parkingId: 'prk_1', points: '38.602, -83.199\n38.604, -83.197', drivenTo: '1' }));
    expect(read.points).toHaveLength(4);
    expect(read.vehicleToIndex).toBe(1);
    expect(schema.parse(approachFormOf(read))).toEqual(read);
    const onFoot = schema.parse(form({ points: '38.602, -83.199\n38.605, -83.195' }));
    expect(onFoot).toMatchObject({ vehicleToIndex: 0, parkingId: null });
    expect(onFoot.points).toHaveLength(2);
  });

  it('refuses a line typed from the stand outward, and a parking place that is gone', () => {
    expect(faults(schema.safeParse(form({ points: '38.605, -83.195\n38.6, -83.2' }))).points).toMatch(/begins near/);
    expect(faults(schema.safeParse(form({ parkingId: 'prk_9', points: '38.602, -83.199' }))).parkingId).toMatch(/gone/);
  });
});

describe('closure form', () => {
  const form = { standId: 'std_1', fromDay: '2026-11-07', toDay: '2026-11-09', reason: 'ladder strap' };

  it('may leave a stand closed until opened, never the whole ground', () => {
    expect(closureSchema.parse({ ...form, toDay: '' })).toEqual({ ...form, toDay: null });
    expect(faults(closureSchema.safeParse({ ...form, standId: '', toDay: '' })).toDay).toMatch(/last closed day/);
    expect(closureSchema.parse({ ...form, standId: '' }).standId).toBe(null);
  });

  it('refuses days that do not exist or run backwards, and no reason', () => {
    expect(
      Object.keys(faults(closureSchema.safeParse({ ...form, fromDay: '2026-02-30', reason: ' ' }))).sort(),
    ).toEqual(['fromDay', 'reason']);
    expect(faults(closureSchema.safeParse({ ...form, toDay: '2026-11-06' })).toDay).toMatch(/before/);
    expect(faults(closureSchema.safeParse({ ...form, toDay: '2028-11-06' })).toDay).toMatch(/at a time/);
  });
});
