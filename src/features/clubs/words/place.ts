import type { Units } from '@/core/units';

/** A rule or a fact in words for people. */
export interface RuleLine {
  label: string;
  text: string;
}

interface Place {
  name: string;
  lat: number;
  lon: number;
  zone: string;
  units: Units;
}

const UNIT_WORDS: Record<Units, string> = {
  us: 'Yards, feet, miles an hour, °F and a 12-hour clock',
  metric: 'Metres, kilometres an hour, °C and a 24-hour clock',
};

/** 34.117 and -84: '34.11700° N, 84.00000° W'. */
export function placeText({ lat, lon }: Pick<Place, 'lat' | 'lon'>): string {
  const half = (value: number, plus: string, minus: string) =>
    `${Math.abs(value).toFixed(5)}° ${value < 0 ? minus : plus}`;
  return `${half(lat, 'N', 'S')}, ${half(lon, 'E', 'W')}`;
}

/** `where` false leaves out where the ground lies. */
export function placeLines(club: Place, where = true): RuleLine[] {
  return [
    { label: 'Name', text: club.name },
    ...(where ? [{ label: 'Place', text: placeText(club) }] : []),
    { label: 'Time zone', text: club.zone.replaceAll('_', ' ') },
    { label: 'Units', text: UNIT_WORDS[club.units] },
  ];
}
