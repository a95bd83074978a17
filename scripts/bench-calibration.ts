import { existsSync, readFileSync } from 'node:fs';
import { parseReplayCsv } from '@/adapters/weather/replay-csv';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { type Calibration, calibrate, pairHours, tuneErrorModel } from '@/core/wind/calibrate';

/** Prints how often the wind was in an arc when arc hold gave it a chance: `npm run bench:calibration [-- FILE]`. */

const file = process.argv[2] ?? process.env.REAL_HOURS ?? '../shared/data/hourly-observations-KEWR-2013-autumn.csv';
const LEADS = [6, 12, 24];
const WIDTHS = [45, 90, 135];
/** Days in UTC: tuned on the first span, reported on the second. */
const TUNE = { from: Date.UTC(2013, 8, 1), to: Date.UTC(2013, 10, 1) };
const REPORT = { from: Date.UTC(2013, 10, 1), to: Date.UTC(2014, 0, 1) };

const percent = (x: number): string => `${(100 * x).toFixed(1)} %`.padStart(7);

function printTable(title: string, results: Calibration[]): void {
  console.log(`\n${title}`);
  console.log(`  chance given  ${WIDTHS.map((w) => `| ${w} deg: given   came  asked`.padEnd(33)).join('')}`);
  for (let i = 0; i < 10; i++) {
    const cells = results.map((r) => {
      const b = r.bins[i];
      return b && b.count > 0 ? `| ${percent(b.given)} ${percent(b.came)} ${String(b.count).padStart(7)}` : '| -';
    });
    console.log(`  ${`${i * 10}-${(i + 1) * 10} %`.padEnd(13)} ${cells.map((c) => c.padEnd(32)).join(' ')}`);
  }
  for (const [i, r] of results.entries()) {
    const skill = 1 - r.brier / r.climateBrier;
    console.log(
      `  ${WIDTHS[i]} deg: Brier ${r.brier.toFixed(4)} (${r.climateBrier.toFixed(4)} from the season's own shares, skill ${percent(skill).trim()}),` +
        ` mean gap ${percent(r.meanGap).trim()}, worst gap ${percent(r.worstGap).trim()} (bins of 2 % and more)`,
    );
  }
}

if (!existsSync(file)) {
  console.error(`No file ${file}. Name one: npm run bench:calibration -- FILE`);
  process.exit(1);
}
const { hours, problems } = parseReplayCsv(readFileSync(file, 'utf8'));
console.log(`${hours.length} hours read, ${problems.length} rows left out.`);
console.log(
  'An observation k hours old stands in for a forecast: far worse than a real one, so the tuned spread is not the default.',
);
console.log(
  'Tuned on September-October, reported on November-December. Stability taken as neutral: the file has no cloud.',
);
for (const lead of LEADS) {
  const tune = pairHours(hours, lead, TUNE.from, TUNE.to);
  const report = pairHours(hours, lead, REPORT.from, REPORT.to);
  const tuned = tuneErrorModel(tune.pairs, WIDTHS, DEFAULT_SETTINGS);
  console.log(
    `\n== ${lead} hours: ${tune.pairs.length} hours to tune, ${report.pairs.length} to report` +
      ` (left out: ${report.noDirection} of no direction, ${report.noForecast} with nothing ${lead} h before)`,
  );
  printTable(
    'As shipped (a forecast’s spread on a stale observation)',
    WIDTHS.map((w) => calibrate(report.pairs, w, DEFAULT_SETTINGS)),
  );
  printTable(
    `Tuned: spread by speed x ${tuned.scale}, stray share ${tuned.strayShare}`,
    WIDTHS.map((w) => calibrate(report.pairs, w, tuned.settings)),
  );
}
