import { daysBetween, formatDay } from '@/core/day-time';
import type { DrawSlot } from '@/db/schema';
import { dayAndWindow, SIT_WINDOW_WORDS, windowsHeld } from '@/features/bookings/words/sits';
import { SLOT_WORDS } from './words/screens';

export function slotName(slot: DrawSlot | undefined, withYear = false): string {
  return slot ? dayAndWindow(slot.day, slot.windows, withYear) : '';
}

/** The slots of a draw in one line, day by day; the year stands once, at the end. */
export function slotsTitle(slots: readonly DrawSlot[], withYear = true): string {
  const days = [...new Set(slots.map((slot) => slot.day))];
  return days
    .map((day, at) => {
      const windows = slots.filter((slot) => slot.day === day).map((slot) => SIT_WINDOW_WORDS[slot.windows]);
      return SLOT_WORDS.dayWith(formatDay(day, withYear && at === days.length - 1), windows);
    })
    .join(SLOT_WORDS.betweenDays);
}

/** A slot that shares hours with an earlier one of the list; -1: none. */
export function overlapAt(slots: readonly DrawSlot[]): number {
  return slots.findIndex((slot, at) =>
    slots
      .slice(0, at)
      .some(
        (other) =>
          other.day === slot.day &&
          windowsHeld(other.windows).some((window) => windowsHeld(slot.windows).includes(window)),
      ),
  );
}

const firstWindow = (slot: DrawSlot) => (slot.windows === 'evening' ? 1 : 0);

export function inOrder(slots: readonly DrawSlot[]): DrawSlot[] {
  return [...slots].sort((a, b) => daysBetween(b.day, a.day) || firstWindow(a) - firstWindow(b));
}
