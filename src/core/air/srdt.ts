import type { StabilityClass } from './stability-types';

/** EPA-454/R-99-005 Table 6-7, day: columns >= 925, 925-675, 675-175 and < 175 W/m2. Rows by upper 10 m speed, m/s. */
const DAY: { belowMps: number; classes: readonly [StabilityClass, StabilityClass, StabilityClass, StabilityClass] }[] =
  [
    { belowMps: 2, classes: ['A', 'A', 'B', 'D'] },
    { belowMps: 3, classes: ['A', 'B', 'C', 'D'] },
    { belowMps: 5, classes: ['B', 'B', 'C', 'D'] },
    { belowMps: 6, classes: ['C', 'C', 'D', 'D'] },
    { belowMps: Number.POSITIVE_INFINITY, classes: ['C', 'D', 'D', 'D'] },
  ];

/** Class by day from 10 m speed (m/s) and downward shortwave radiation (W/m2). Solar radiation / delta-T method. */
export function srdtDay(speedMps: number, radiationWm2: number): StabilityClass {
  const column = radiationWm2 >= 925 ? 0 : radiationWm2 >= 675 ? 1 : radiationWm2 >= 175 ? 2 : 3;
  return (DAY.find((r) => speedMps < r.belowMps) ?? DAY[DAY.length - 1])?.classes[column] ?? 'D';
}

/** Class by night from 10 m speed (m/s) and whether temperature rises with height (an inversion). Same table. */
export function srdtNight(speedMps: number, inversion: boolean): StabilityClass {
  if (speedMps < 2) return inversion ? 'F' : 'E';
  if (speedMps < 2.5) return inversion ? 'E' : 'D';
  return 'D';
}
