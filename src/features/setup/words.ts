import type { FindingCode } from '@/core/setup-check/setup-types';

export const CODE_WORDS: Record<FindingCode, string> = {
  off_shot: 'Off the shot',
  beside_approach: 'Beside the walk',
  unhuntable: 'No wind for it',
  crowded_scrapes: 'Too many scrapes',
  off_lines: 'Off the line',
  approach_crosses: 'Walk crosses a line',
  approach_upwind: 'Walk upwind of beds',
  seat_sun: 'Seat in the sun',
  camera_sun: 'Camera in the sun',
};
