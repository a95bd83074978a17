import { existsSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { parseReplayCsv } from '@/adapters/weather/replay-csv';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { calibrate, pairHours } from '@/core/wind/calibrate';

const file = process.env.REAL_HOURS ?? '../shared/data/hourly-observations-KEWR-2013-autumn.csv';

// US federal airport observations, September to December 2013; skipped where the file is not at hand.
describe.skipIf(!existsSync(file))('arc hold against real hours, the observation 6 hours before as forecast', () => {
  const { hours } = existsSync(file) ? parseReplayCsv(readFileSync(file, 'utf8')) : { hours: [] };
  const { pairs } = pairHours(hours, 6, Date.UTC(2013, 10, 1), Date.UTC(2014, 0, 1));

  it.each([45, 90, 135])(
    'as shipped is within 7 points of what came, and better than the season’s shares: %s degrees',
    (width) => {
      expect(pairs.length).toBeGreaterThan(1000);
      const result = calibrate(pairs, width, DEFAULT_SETTINGS);
      expect(result.worstGap).toBeLessThan(0.07);
      expect(result.brier).toBeLessThan(result.climateBrier);
    },
  );
});
