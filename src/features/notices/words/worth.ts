import { sectorName } from '@/core/sectors';
import type { SitWorth } from '../judge-sits';

/** 'NW, in its good winds 84 % of the sit; quiet 78' */
export function worthText({ quiet, hold, windFromDeg }: Pick<SitWorth, 'quiet' | 'hold' | 'windFromDeg'>): string {
  const wind = windFromDeg === null ? 'wind variable or not known' : `${sectorName(windFromDeg)} wind`;
  const held = hold === null ? '' : `, in its good winds ${Math.round(hold * 100)} % of the sit`;
  return `${wind}${held}; quiet ${Math.round(quiet)}`;
}
