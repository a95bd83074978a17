import { describe, expect, it } from 'vitest';
import { chooseFindings } from './choose-findings';
import type { FindingView } from './reads';

const stand = (id: string) => ({ id, name: `Stand ${id}` });
const finding = (key: string, at: string | null, gain: number, over: Partial<FindingView> = {}): FindingView => ({
  key,
  print: 'p',
  code: 'off_shot',
  text: key,
  why: '',
  effect: null,
  effectShort: null,
  gain,
  evidence: 'practice',
  acts: [],
  rules: [],
  stand: at === null ? null : stand(at),
  also: [],
  subject: { of: 'feature', id: key, name: key },
  at: { lat: 0, lon: 0 },
  answer: null,
  ...over,
});

const ALL = [
  finding('a1', 'a', 2),
  finding('b1', 'b', 0, { code: 'seat_sun' }),
  finding('a2', 'a', 9),
  finding('camera', null, 0, { code: 'camera_sun' }),
  finding('c1', 'c', 5, { also: [stand('a')] }),
];
const shown = (search: Record<string, string>) =>
  chooseFindings(ALL, search).groups.map((g) => [
    g.stand?.id ?? null,
    g.findings.map((f) => `${f.number} ${f.finding.key}`),
  ]);

describe('findings by stand', () => {
  it('stand with the costliest first, numbered through', () => {
    expect(shown({})).toEqual([
      ['a', ['1 a2', '2 a1']],
      ['c', ['3 c1']],
      ['b', ['4 b1']],
      [null, ['5 camera']],
    ]);
  });

  it('are those of the stand or kind asked for, with what touches the stand', () => {
    expect(shown({ stand: 'a' })).toEqual([
      ['a', ['1 a2', '2 a1']],
      ['c', ['3 c1']],
    ]);
    expect(shown({ what: 'seat_sun' })).toEqual([['b', ['1 b1']]]);
    expect(shown({ stand: 'c', what: 'seat_sun' })).toEqual([]);
    expect(shown({ stand: 'nowhere', what: 'nothing' })).toHaveLength(4);
  });
});
