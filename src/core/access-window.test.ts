import { describe, expect, it } from 'vitest';
import { guestActive } from './access-window';

describe('guestActive', () => {
  const guest = { role: 'guest' as const, fromDay: '2026-11-06', toDay: '2026-11-08' };

  it('holds from the first day to the last', () => {
    const days = ['2026-11-05', '2026-11-06', '2026-11-08', '2026-11-09'];
    expect(days.map((day) => guestActive(guest, day))).toEqual([false, true, true, false]);
  });

  it('never holds for a guest without both dates', () => {
    expect(guestActive({ ...guest, toDay: null }, '2026-11-07')).toBe(false);
    expect(guestActive({ ...guest, fromDay: null }, '2026-11-07')).toBe(false);
  });

  it('needs no dates of the others, and keeps to those they have', () => {
    expect(guestActive({ role: 'member', fromDay: null, toDay: null }, '2026-11-07')).toBe(true);
    expect(guestActive({ role: 'member', fromDay: null, toDay: '2026-11-06' }, '2026-11-07')).toBe(false);
  });
});
