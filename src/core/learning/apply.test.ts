import { describe, expect, it } from 'vitest';
import { makeInput, makeStand } from '../../../tests/helpers/small-ground';
import { rankSits } from '../rank';

describe('an adjustment in the scoring', () => {
  const judge = (quietShift?: number) =>
    rankSits(makeInput({ stands: [makeStand({ id: 'oak', ...(quietShift === undefined ? {} : { quietShift }) })] }))[0];

  it('moves quiet by its points and says so, as from the club log', () => {
    const plain = judge();
    const taught = judge(-12);
    expect((plain?.quiet ?? 0) - (taught?.quiet ?? 0)).toBeCloseTo(12, 9);
    const reason = taught?.reasons.find(({ code }) => code === 'learned');
    expect(reason).toMatchObject({
      evidence: 'club log',
      text: 'Sits here have gone louder than the sums say: 12 points',
    });
    expect(reason?.change).toBeLessThan(0);
    expect(plain?.reasons.some(({ code }) => code === 'learned')).toBe(false);
  });

  it('never takes quiet out of 0 to 100, and 0 changes nothing', () => {
    expect(judge(500)?.quiet).toBe(100);
    expect(judge(-500)?.quiet).toBe(0);
    expect(judge(0)).toEqual(judge());
  });
});
