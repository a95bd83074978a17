import { describe, expect, it } from 'vitest';
import type { WeekCell, WeekColumnView } from './view-types';
import { cellText, groupByDay, rankedCells } from './week-cells';

function cell(standId: string, more: Partial<WeekCell> = {}): WeekCell {
  return {
    standId,
    open: true,
    mine: false,
    word: 'Quiet',
    score: 60,
    quiet: 80,
    hold: 0.84,
    strip: 0,
    gate: null,
    ...more,
  };
}

function column(day: string, window: 'morning' | 'evening', cells: WeekCell[], order: string[]): WeekColumnView {
  return { window: { day, window, startAt: 0, endAt: 1 }, dayText: day, cells, order };
}

describe('the week', () => {
  it('lists a window’s cells by rank, as the filter says', () => {
    const one = column(
      '2026-11-07',
      'morning',
      [cell('a'), cell('b', { mine: true }), cell('c', { open: false })],
      ['b', 'a', 'c'],
    );
    expect(rankedCells(one, 'all').map((c) => c.standId)).toEqual(['b', 'a', 'c']);
    expect(rankedCells(one, 'open').map((c) => c.standId)).toEqual(['a']);
    expect(rankedCells(one, 'mine').map((c) => c.standId)).toEqual(['b']);
  });

  it('puts the windows of a day together', () => {
    const days = groupByDay([
      column('2026-11-06', 'evening', [], []),
      column('2026-11-07', 'morning', [], []),
      column('2026-11-07', 'evening', [], []),
    ]);
    expect(days.map(({ day, columns }) => [day, columns.length])).toEqual([
      ['2026-11-06', 1],
      ['2026-11-07', 2],
    ]);
  });

  it('says in words what a strip shows', () => {
    expect(cellText(cell('a'))).toBe('wind in its arcs 84 % of the sit');
    expect(cellText(cell('a', { strip: null }))).toBe('no forecast');
    expect(cellText(cell('a', { hold: null }))).toBe('no good winds set');
    expect(cellText(cell('a', { open: false, gate: 'Resting.' }))).toBe('not open: Resting.');
  });
});
