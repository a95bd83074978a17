import { z } from 'zod';
import { isClock } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { AGE_CLASSES, AGE_METHODS } from '@/core/harvest/harvest-types';
import { inToMm, kgToLb, lbToKg, mmToIn, type Units } from '@/core/units';
import { numberText } from '@/features/clubs/read-number';
import { type FormReader, LINE_MAX, readForm } from '@/features/ground/read-form';
import { DEER_KINDS, deerKind } from './deer-kind';
import type { HarvestRow } from './harvests-data';
import { HARVEST_FIELD_ERRORS as ERRORS, HARVEST_NUMBERS as NUMBERS } from './words/sheet';

const line = z.string().max(LINE_MAX, ERRORS.long(LINE_MAX));
const orNone = <T extends z.ZodType>(choice: T) => choice.or(z.literal('')).or(z.null().transform(() => '' as const));

/** The sheet as its form holds it: text in the club's units. */
export const harvestFormSchema = z.object({
  /** One for each form opened, so that a second press cannot count a deer twice. */
  requestKey: z.guid(ERRORS.reload),
  /** Membership of who took it; of a guest without an account, of the member who answers for them. */
  hunterId: z.string().min(1, ERRORS.hunter).max(40),
  guestName: line,
  sitId: z.string().max(40),
  day: line,
  clock: line,
  standId: z.string().max(40),
  place: line,
  weapon: z.enum(WEAPONS, { error: ERRORS.weapon }),
  deer: z.enum(DEER_KINDS, { error: ERRORS.deer }),
  age: orNone(z.enum(AGE_CLASSES)),
  ageMethod: orNone(z.enum(AGE_METHODS)),
  dressed: line,
  live: line,
  pointsLeft: line,
  pointsRight: line,
  insideSpread: line,
  mainBeamLeft: line,
  mainBeamRight: line,
  lactating: orNone(z.enum(['yes', 'no'])),
  notes: z.string().max(1000, ERRORS.notes(1000)),
});
export type HarvestForm = z.input<typeof harvestFormSchema>;

export const changeHarvestInput = harvestFormSchema.extend({
  id: z.string().min(1).max(40),
  version: z.number().int().positive(),
});

/** What a sheet says, in SI; who it counts on is worked out from the hunter. */
export interface HarvestInput
  extends Pick<
    HarvestRow,
    | 'weapon'
    | 'sex'
    | 'antlered'
    | 'age'
    | 'ageMethod'
    | 'dressedKg'
    | 'liveKg'
    | 'pointsLeft'
    | 'pointsRight'
    | 'insideSpreadMm'
    | 'mainBeamLeftMm'
    | 'mainBeamRightMm'
    | 'lactating'
    | 'day'
    | 'sitId'
    | 'standId'
    | 'place'
    | 'notes'
    | 'requestKey'
  > {
  hunterId: string;
  guestName: string;
  clock: string;
}

const MOST_KG = 250;
const MOST_MM = 1000;

function readWeight(form: FormReader, path: string, text: string, label: string, units: Units): number | null {
  const us = units === 'us';
  const max = us ? Math.floor(kgToLb(MOST_KG)) : MOST_KG;
  const value = form.number(path, text, { label, min: 1, max, unit: us ? 'lb' : 'kg' });
  return value !== null && us ? lbToKg(value) : value;
}

function readLength(form: FormReader, path: string, text: string, label: string, units: Units): number | null {
  const us = units === 'us';
  const rule = { label, min: 0, max: us ? Math.floor(mmToIn(MOST_MM)) : MOST_MM / 10, unit: us ? 'in' : 'cm' };
  const value = form.number(path, text, rule);
  if (value === null) return null;
  return us ? inToMm(value) : value * 10;
}

function readAntlers(form: FormReader, typed: z.output<typeof harvestFormSchema>, units: Units) {
  const points = { min: 0, max: 40, whole: true };
  const none = typed.deer !== 'antlered_buck';
  const text = (value: string) => (none ? '' : value);
  return {
    pointsLeft: form.number('pointsLeft', text(typed.pointsLeft), { label: NUMBERS.points, ...points }),
    pointsRight: form.number('pointsRight', text(typed.pointsRight), { label: NUMBERS.points, ...points }),
    insideSpreadMm: readLength(form, 'insideSpread', text(typed.insideSpread), NUMBERS.spread, units),
    mainBeamLeftMm: readLength(form, 'mainBeamLeft', text(typed.mainBeamLeft), NUMBERS.beam, units),
    mainBeamRightMm: readLength(form, 'mainBeamRight', text(typed.mainBeamRight), NUMBERS.beam, units),
  };
}

export function makeHarvestSchema(units: Units) {
  return harvestFormSchema.transform((typed, ctx): HarvestInput => {
    const form = readForm(ctx);
    const day = form.day('day', typed.day);
    const clock = typed.clock.trim();
    if (!isClock(clock)) form.fail('clock', ERRORS.time);
    if (typed.age !== '' && typed.ageMethod === '') form.fail('ageMethod', ERRORS.method);
    const dressedKg = readWeight(form, 'dressed', typed.dressed, NUMBERS.dressed, units);
    const liveKg = readWeight(form, 'live', typed.live, NUMBERS.live, units);
    if (dressedKg !== null && liveKg !== null && dressedKg >= liveKg) {
      form.fail('dressed', ERRORS.swapped);
    }
    const antlers = readAntlers(form, typed, units);
    if (form.failed()) return z.NEVER;
    const doe = typed.deer === 'doe';
    return {
      requestKey: typed.requestKey,
      hunterId: typed.hunterId,
      guestName: typed.guestName.trim().replace(/\s+/g, ' '),
      sitId: typed.sitId || null,
      day,
      clock,
      standId: typed.standId || null,
      place: typed.place.trim(),
      weapon: typed.weapon,
      sex: doe ? 'doe' : 'buck',
      antlered: typed.deer === 'antlered_buck',
      age: typed.age || null,
      ageMethod: typed.age === '' ? null : typed.ageMethod || null,
      dressedKg,
      liveKg,
      ...antlers,
      lactating: doe && typed.lactating !== '' ? typed.lactating === 'yes' : null,
      notes: typed.notes.trim(),
    };
  });
}

export const weightText = (kg: number | null, units: Units) =>
  numberText(kg !== null && units === 'us' ? kgToLb(kg) : kg, 1);

const lengthText = (mm: number | null, units: Units) =>
  numberText(mm === null ? null : units === 'us' ? mmToIn(mm) : mm / 10, 3);

export type NewHarvest = Pick<
  HarvestForm,
  'requestKey' | 'hunterId' | 'sitId' | 'day' | 'clock' | 'standId' | 'weapon'
>;

export function emptyHarvestForm(known: NewHarvest): HarvestForm {
  return {
    ...known,
    guestName: '',
    place: '',
    deer: 'doe',
    age: '',
    ageMethod: '',
    dressed: '',
    live: '',
    pointsLeft: '',
    pointsRight: '',
    insideSpread: '',
    mainBeamLeft: '',
    mainBeamRight: '',
    lactating: '',
    notes: '',
  };
}

export function harvestFormOf(row: HarvestRow, clock: string, units: Units): HarvestForm {
  const yesNo = row.lactating ? 'yes' : 'no';
  return {
    requestKey: row.requestKey,
    hunterId: row.guestId ?? row.memberId,
    guestName: row.guestId === null ? row.guestName : '',
    sitId: row.sitId ?? '',
    day: row.day,
    clock,
    standId: row.standId ?? '',
    place: row.place,
    weapon: row.weapon,
    deer: deerKind(row),
    age: row.age ?? '',
    ageMethod: row.ageMethod ?? '',
    dressed: weightText(row.dressedKg, units),
    live: weightText(row.liveKg, units),
    pointsLeft: numberText(row.pointsLeft),
    pointsRight: numberText(row.pointsRight),
    insideSpread: lengthText(row.insideSpreadMm, units),
    mainBeamLeft: lengthText(row.mainBeamLeftMm, units),
    mainBeamRight: lengthText(row.mainBeamRightMm, units),
    lactating: row.lactating === null ? '' : yesNo,
    notes: row.notes,
  };
}
