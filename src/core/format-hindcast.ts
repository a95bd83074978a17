import type { Hindcast } from './hindcast';
import { HINDCAST_WORDS } from './words/hindcast';

const percent = (share: number | null) => (share === null ? '-' : `${(100 * share).toFixed(0)} %`);

function table(rows: string[][]): string[] {
  const widths = (rows[0] ?? []).map((_, c) => Math.max(...rows.map((row) => (row[c] ?? '').length)));
  return rows.map((row) =>
    row
      .map((cell, c) => (c === 0 ? cell.padEnd(widths[c] ?? 0) : cell.padStart(widths[c] ?? 0)))
      .join('  ')
      .trimEnd(),
  );
}

/** A hindcast as plain text for a terminal: stands by share of windows, winds by how often they blew, what is not covered. */
export function formatHindcast(h: Hindcast): string {
  const stands = [...h.stands].sort(
    (a, b) => (b.share ?? -1) - (a.share ?? -1) || (a.standName < b.standName ? -1 : 1),
  );
  const standRows = stands.map((s) => [
    s.standName,
    `${s.sittable.morning}/${s.judged.morning}`,
    `${s.sittable.evening}/${s.judged.evening}`,
    percent(s.share),
    percent(s.coveredShare),
  ]);
  const sectorRows = h.sectors.map((s) => [s.sector, percent(s.share), String(s.stands)]);
  const uncovered =
    h.uncovered.length === 0
      ? HINDCAST_WORDS.allCovered
      : HINDCAST_WORDS.uncovered(h.uncovered.map((s) => `${s.sector} (${percent(s.share)})`));
  return [
    HINDCAST_WORDS.judged(h.judged, h.windows, percent(h.noDirectionShare)),
    '',
    ...table([[...HINDCAST_WORDS.standHeadings], ...standRows]),
    '',
    ...table([[...HINDCAST_WORDS.windHeadings], ...sectorRows]),
    '',
    uncovered,
    HINDCAST_WORDS.noStand(h.noStand.length),
  ].join('\n');
}
