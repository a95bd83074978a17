import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, daysBetween } from '../day-time';
import { firstRestedDay, restGates, restingUntil } from './rest';

const sat = (day: string, memberName = 'Odell Pruitt') => ({ day, memberName });
const gatesOn = (day: string, sits: { day: string; memberName: string }[], restDays = 3) =>
  restGates({ standName: 'Creek Ladder', restDays, day, sits });

describe('rest', () => {
  it('after a sit on Saturday 7 November with 3 rest days: resting 8, 9, 10; ready 11', () => {
    // Counted as clubs that rest stands count it (common practice).
    const codes = ['2026-11-07', '2026-11-08', '2026-11-09', '2026-11-10', '2026-11-11'].map((day) =>
      gatesOn(day, [sat('2026-11-07')]).map((g) => g.code),
    );
    expect(codes).toEqual([[], ['resting'], ['resting'], ['resting'], []]);
    expect(gatesOn('2026-11-08', [sat('2026-11-07')])[0]).toEqual({
      code: 'resting',
      text: 'Creek Ladder is resting: Odell Pruitt sat there on Sat 7 Nov. The rule is 3 full days of rest, so it rests through Tue 10 Nov.',
      endsOn: '2026-11-11',
    });
  });

  it('holds the other way round: a sit may not break the rest of one booked later', () => {
    const [gate] = gatesOn('2026-11-08', [sat('2026-11-11')]);
    expect(gate).toMatchObject({ code: 'breaks_later_rest', endsOn: '2026-11-11' });
    expect(gate?.text).toContain('booked by Odell Pruitt on Wed 11 Nov');
    expect(gatesOn('2026-11-07', [sat('2026-11-11')])).toEqual([]);
  });

  it('names both when a day lies between two sits, and the day on which neither is broken', () => {
    const gates = gatesOn('2026-11-09', [sat('2026-11-07'), sat('2026-11-12', 'June Hale')]);
    expect(gates.map((g) => [g.code, g.endsOn])).toEqual([
      ['resting', '2026-11-12'],
      ['breaks_later_rest', '2026-11-12'],
    ]);
  });

  it('is nothing on the same day or with 0 rest days', () => {
    expect(gatesOn('2026-11-07', [sat('2026-11-07'), sat('2026-11-07', 'June Hale')])).toEqual([]);
    expect(gatesOn('2026-11-08', [sat('2026-11-07')], 0)).toEqual([]);
  });

  it('says until when', () => {
    const until = (day: string) => restingUntil({ restDays: 3, sitDays: ['2026-11-01', '2026-11-07'], day });
    expect(['2026-11-07', '2026-11-08', '2026-11-10', '2026-11-11'].map(until)).toEqual([
      null,
      '2026-11-10',
      '2026-11-10',
      null,
    ]);
  });

  it('looks the same from both sides, and ends where it says', () => {
    const offset = fc.integer({ min: 0, max: 60 }).map((n) => addDays('2026-10-20', n));
    fc.assert(
      fc.property(
        offset,
        fc.array(offset, { maxLength: 8 }),
        fc.integer({ min: 0, max: 10 }),
        (day, days, restDays) => {
          const sits = days.map((d) => sat(d));
          const gates = gatesOn(day, sits, restDays);
          const near = days.some((d) => d !== day && Math.abs(daysBetween(d, day)) <= restDays);
          expect(gates.length > 0).toBe(near);
          for (const d of days)
            expect(gatesOn(day, [sat(d)], restDays).length).toBe(gatesOn(d, [sat(day)], restDays).length);
          for (const gate of gates) expect(gatesOn(gate.endsOn ?? '', sits, restDays)).toEqual([]);
          expect(firstRestedDay({ restDays, sitDays: days, day }) >= day).toBe(true);
        },
      ),
    );
  });
});
