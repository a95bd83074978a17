import { describe, expect, it } from 'vitest';
import { PLACE, rulesWith } from '../booking/example-booking';
import { localToUtc } from '../day-time';
import { allDayWindows, sitWindow } from '../windows';
import { type BackByInput, defaultBackBy, nextClock } from './back-by';
import { boardState, lapsesAt } from './board-state';
import { dueSteps, overdueStepTimes } from './overdue-steps';

const MIN = 60_000;
const NY = 'America/New_York';
const at = (day: string, clock: string, zone = NY) => localToUtc(day, clock, zone);

describe('the board', () => {
  const sit = { startAt: 100 * MIN, endAt: 400 * MIN, backByMinutes: 60 };
  const state = (now: number, outing: { backBy: number; signedOutAt: number | null } | null = null) =>
    boardState({ ...sit, outing, now: now * MIN });

  it('says due, late and unsigned of a sit nobody signed in for, to the minute', () => {
    expect([99, 100, 399, 400].map((now) => state(now))).toEqual(['due', 'late', 'late', 'unsigned']);
  });

  it('says in until the allowance after the back-by is over, then overdue until somebody signs out', () => {
    const open = { backBy: 420 * MIN, signedOutAt: null };
    expect([50, 420, 479, 480, 100_000].map((now) => state(now, open))).toEqual([
      'in',
      'in',
      'in',
      'overdue',
      'overdue',
    ]);
    expect(state(100_000, { ...open, signedOutAt: 500 * MIN })).toBe('out');
  });

  it('lets an unsigned claim lapse after the hold, counted from the later of start and booking', () => {
    expect(lapsesAt({ startAt: 100 * MIN, updatedAt: 5 * MIN }, 45)).toBe(145 * MIN);
    expect(lapsesAt({ startAt: 100 * MIN, updatedAt: 130 * MIN }, 45)).toBe(175 * MIN);
    expect(lapsesAt({ startAt: 100 * MIN, updatedAt: 5 * MIN }, null)).toBeNull();
  });
});

describe('back by', () => {
  const evening = sitWindow('2026-11-10', 'evening', rulesWith({}), PLACE);
  const ask = (over: Partial<BackByInput> = {}): BackByInput => ({
    day: '2026-11-10',
    windows: ['evening'],
    endAt: evening.endAt,
    weapon: 'bow',
    walkOutSeconds: 600,
    rules: rulesWith({}),
    place: PLACE,
    ...over,
  });

  it('is the end of the window and the walk out, up to the next five minutes', () => {
    const back = defaultBackBy(ask());
    expect(back % (5 * MIN)).toBe(0);
    expect(back - evening.endAt).toBeGreaterThanOrEqual(10 * MIN);
    expect(back - evening.endAt).toBeLessThan(15 * MIN);
  });

  it("is counted from the club's legal end of an evening where that is later, never of a morning", () => {
    const light = { name: 'Deer', minutesBeforeSunrise: 30, source: 'typed by the club', statedOn: '2026-09-01' };
    const late = rulesWith({ legalLight: [{ ...light, minutesAfterSunset: 60 }] });
    const early = rulesWith({ legalLight: [{ ...light, minutesAfterSunset: 0 }] });
    expect(defaultBackBy(ask({ rules: late })) - defaultBackBy(ask())).toBe(30 * MIN);
    expect(defaultBackBy(ask({ rules: early }))).toBe(defaultBackBy(ask()));
    const morning = sitWindow('2026-11-10', 'morning', late, PLACE);
    const back = defaultBackBy(ask({ rules: late, windows: ['morning'], endAt: morning.endAt }));
    expect(back).toBe(at('2026-11-10', '11:10'));
    const both = allDayWindows('2026-11-10', late, PLACE).map((span) => span.window);
    expect(defaultBackBy(ask({ rules: late, windows: both }))).toBe(defaultBackBy(ask({ rules: late })));
  });

  it('as a clock time is the next time the clock shows it, over midnight too', () => {
    expect(nextClock('18:30', at('2026-11-10', '05:00'), NY)).toBe(at('2026-11-10', '18:30'));
    expect(nextClock('01:30', at('2026-11-10', '20:00'), NY)).toBe(at('2026-11-11', '01:30'));
    const now = at('2026-11-10', '18:30');
    expect(nextClock('18:30', now, NY)).toBe(at('2026-11-11', '18:30'));
  });

  it('as a clock time holds where clocks change (US: back on 1 Nov 2026, on 14 Mar 2027)', () => {
    const first = Date.UTC(2026, 10, 1, 5, 30);
    expect(nextClock('01:30', first - 20 * MIN, NY)).toBe(first);
    expect(nextClock('01:30', first + 20 * MIN, NY)).toBe(first + 60 * MIN);
    expect(nextClock('01:30', first + 80 * MIN, NY)).toBe(at('2026-11-02', '01:30'));
    const skipped = nextClock('02:30', at('2027-03-13', '22:00'), NY);
    expect(skipped).toBe(Date.UTC(2027, 2, 14, 7, 30));
    // Lord Howe Island goes back half an hour at 02:00 on 4 Apr 2027: 01:45 is shown twice.
    const island = 'Australia/Lord_Howe';
    const once = at('2027-04-04', '01:45', island);
    expect(nextClock('01:45', once + MIN, island)).toBe(once + 30 * MIN);
  });
});

describe('overdue steps', () => {
  const rules = rulesWith({});

  it('come in order after back-by and allowance (our defaults: 0, 15 and 30 minutes after 60)', () => {
    const back = at('2026-11-10', '23:30');
    expect(overdueStepTimes(back, rules).map((step) => (step.at - back) / MIN)).toEqual([60, 75, 90]);
    expect(dueSteps(back, rules, back + 60 * MIN - 1)).toEqual([]);
    expect(dueSteps(back, rules, back + 75 * MIN)).toEqual(['member', 'officers']);
    expect(dueSteps(back, rules, back + 9000 * MIN)).toEqual(['member', 'officers', 'contact']);
  });

  it('move with the back-by (common practice: a tracked deer moves the time)', () => {
    const back = at('2026-11-10', '18:30');
    expect(dueSteps(back + 120 * MIN, rules, back + 90 * MIN)).toEqual([]);
  });
});
