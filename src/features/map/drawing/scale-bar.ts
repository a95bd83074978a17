import { mToYd, type Units } from '@/core/units';

export interface ScaleBar {
  /** Of the ground, in yards or metres. */
  length: number;
  label: string;
  /** Of the screen. */
  px: number;
}

/** The longest bar of a round length that fits. 1, 2 or 5 times a power of ten; none on a map without a size. */
export function scaleBar(metresPerPx: number, mostPx: number, units: Units): ScaleBar | null {
  const perPx = units === 'us' ? mToYd(metresPerPx) : metresPerPx;
  const most = perPx * mostPx;
  if (!(most > 0) || !Number.isFinite(most)) return null;
  const power = 10 ** Math.floor(Math.log10(most));
  const length = ([5, 2, 1] as const).map((n) => n * power).find((one) => one <= most * (1 + 1e-12)) ?? power;
  return {
    length,
    label: `${length.toLocaleString('en-US', { maximumFractionDigits: 3 })} ${units === 'us' ? 'yd' : 'm'}`,
    px: length / perPx,
  };
}

/** Ground metres in a screen pixel of a Web Mercator map (256 px tiles) at a latitude and zoom. */
export function metresPerPixel(lat: number, zoom: number): number {
  return (2 * Math.PI * 6378137 * Math.cos((lat * Math.PI) / 180)) / (256 * 2 ** zoom);
}
