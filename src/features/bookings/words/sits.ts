import { WINDOW_NAMES, type WindowName } from '@/core/condition-types';
import { formatClock, formatClock12, formatDay } from '@/core/day-time';
import { SIT_WINDOW_WORDS } from '@/core/words/windows';

/** What a sit holds: one window, or the whole day. */
export const SIT_WINDOWS = [...WINDOW_NAMES, 'all_day'] as const;
export type SitWindows = (typeof SIT_WINDOWS)[number];

export { SIT_WINDOW_WORDS };

export function windowsHeld(windows: SitWindows): WindowName[] {
  return windows === 'all_day' ? [...WINDOW_NAMES] : [windows];
}

interface Clock {
  zone: string;
  units: 'us' | 'metric';
}

/** A time as the club reads it: 12-hour clocks go with US units. */
export function clockText(at: number, club: Clock): string {
  return club.units === 'us' ? formatClock12(at, club.zone) : formatClock(at, club.zone);
}

/** 'America/New York' */
export const zoneText = (zone: string) => zone.replaceAll('_', ' ');

export function spanText(startAt: number, endAt: number, club: Clock): string {
  return `${clockText(startAt, club)} to ${clockText(endAt, club)}`;
}

/** 'Sat 7 Nov, morning'. */
export function dayAndWindow(day: string, windows: SitWindows, withYear = false): string {
  return `${formatDay(day, withYear)}, ${SIT_WINDOW_WORDS[windows]}`;
}
