import { describe, expect, it } from 'vitest';
import { newLogForm, proposedSpan } from './log-form';
import { logFormSchema } from './log-schema';

const zone = 'America/New_York';
const at = (clock: string) => Date.parse(`2026-11-07T${clock}:00-05:00`);
const sit = { id: 'sit_1', day: '2026-11-07', startAt: at('06:20'), endAt: at('11:00') };
const nobody = { inAt: null, outAt: null };
const LATER = at('20:00');

describe('the hours a log starts from', () => {
  it('are those of the sit', () => {
    expect(newLogForm(sit, nobody, LATER, zone)).toMatchObject({ startClock: '06:20', endClock: '11:00' });
  });

  it('are cut to when the member signed in and out', () => {
    const span = proposedSpan(sit, { inAt: at('07:00'), outAt: at('09:33') }, LATER);
    expect(span).toEqual({ startAt: at('07:00'), endAt: at('09:30') });
    const wide = proposedSpan(sit, { inAt: at('05:40'), outAt: at('12:10') }, LATER);
    expect(wide).toEqual({ startAt: sit.startAt, endAt: sit.endAt });
  });

  it('end now while the sit goes on, and are the whole sit where too little is left', () => {
    expect(proposedSpan(sit, nobody, at('09:02')).endAt).toBe(at('09:00'));
    expect(proposedSpan(sit, { inAt: at('06:00'), outAt: at('06:21') }, LATER)).toEqual({
      startAt: sit.startAt,
      endAt: sit.endAt,
    });
  });

  it('do not reach into what is to come while the sit has only begun', () => {
    const began = { startAt: sit.startAt, endAt: at('06:25') };
    expect(proposedSpan(sit, nobody, at('06:21'))).toEqual(began);
    expect(proposedSpan(sit, { inAt: at('06:00'), outAt: null }, at('06:24'))).toEqual(began);
    expect(proposedSpan(sit, { inAt: at('08:58'), outAt: null }, at('09:00'))).toEqual(began);
  });
});

describe('what a log form takes', () => {
  const typed = newLogForm(sit, nobody, LATER, zone);
  const problems = (more: object) =>
    (logFormSchema.safeParse({ ...typed, ...more }).error?.issues ?? []).map((issue) => issue.path.join('.'));

  it('is itself, as it is first shown', () => {
    expect(problems({})).toEqual([]);
  });

  it('is whole counts from none up, and an end after the start', () => {
    expect(problems({ does: -1, fawns: 1.5, unknown: 201 })).toEqual(['does', 'fawns', 'unknown']);
    expect(problems({ endClock: '06:20' })).toEqual(['endClock']);
    expect(problems({ startClock: '25:00' })).toEqual(['startClock']);
  });

  it('asks of a hit when, where and how it stands, of a miss when', () => {
    expect(problems({ shot: 'hit' })).toEqual(['shotClock', 'hitPlace', 'followUp']);
    expect(problems({ shot: 'missed' })).toEqual(['shotClock']);
    expect(problems({ shot: 'hit', shotClock: '08:00', hitPlace: 'unsure', followUp: 'waiting' })).toEqual([]);
  });
});
