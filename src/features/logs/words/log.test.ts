import { expect, it } from 'vitest';
import { bumpsText, countsText, shotText } from './log';

it('counts deer in words', () => {
  expect(countsText({ antleredBucks: 1, does: 2, fawns: 0, unknown: 1 })).toBe('1 buck, 2 does, 1 unknown');
  expect(countsText({ antleredBucks: 0, does: 0, fawns: 0, unknown: 0 })).toBe('No deer');
});

it('says where deer were bumped', () => {
  const none = { bumpedIn: 0, bumpedSitting: 0, bumpedOut: 0, bumpedWhere: 'by the creek' };
  expect(bumpsText(none)).toBe('');
  expect(bumpsText({ ...none, bumpedIn: 2, bumpedOut: 1 })).toBe('2 on the way in, 1 on the way out (by the creek)');
});

it('says what came of a shot', () => {
  expect(shotText({ shot: 'none', hitPlace: null, followUp: null })).toBe('');
  expect(shotText({ shot: 'missed', hitPlace: null, followUp: null })).toBe('Missed');
  expect(shotText({ shot: 'hit', hitPlace: 'heart_lungs', followUp: 'recovered' })).toBe(
    'Hit, heart or lungs: recovered',
  );
});
