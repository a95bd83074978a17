import { dayOf, formatClock, formatClock12, formatDay } from '@/core/day-time';

/** 'sit.cancelled_late' as people read it: 'sit: cancelled late'. */
export function actionWords(action: string): string {
  return action.replace('.', ': ').replaceAll('_', ' ');
}

/** 'Sat 7 Nov 2026, 6:05 AM' in the club's zone. */
export function momentText(at: number, club: { zone: string; units: 'us' | 'metric' }): string {
  const clock = club.units === 'us' ? formatClock12(at, club.zone) : formatClock(at, club.zone);
  return `${formatDay(dayOf(at, club.zone), true)}, ${clock}`;
}

export interface DetailLine {
  term: string;
  text: string;
}

function plain(value: unknown): string {
  if (value === null || value === undefined) return 'none';
  return typeof value === 'string' ? value : JSON.stringify(value);
}

interface Changed {
  label: string;
  before: unknown;
  after: unknown;
}

const isChanged = (value: unknown): value is Changed =>
  typeof value === 'object' && value !== null && 'label' in value && 'before' in value && 'after' in value;

/** What a row keeps beside its sentence, as lines; a list of changes reads before → after. */
export function detailLines(detail: Record<string, unknown>): DetailLine[] {
  return Object.entries(detail).flatMap(([term, value]): DetailLine[] => {
    if (Array.isArray(value) && value.length > 0 && value.every(isChanged)) {
      return value.map((line) => ({ term: String(line.label), text: `${plain(line.before)} → ${plain(line.after)}` }));
    }
    return [{ term, text: plain(value) }];
  });
}
