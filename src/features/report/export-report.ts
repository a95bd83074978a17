import { quotaText } from '@/core/harvest/quotas';
import type { Figure } from '@/core/indices';
import type { BumpCount } from '@/core/report/bumps';
import { write } from '@/db/client';
import { tableRow } from '@/features/logs/export-sightings';
import { TABLE_FILE_HEADINGS } from '@/features/logs/words/sightings';
import { toCsv } from '@/lib/csv';
import { audit } from '@/server/audit';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type Report, readReport } from './reads';
import type { ReportAsk, ReportPart } from './report-schema';
import { FILE_GROUPS, FILE_HEADINGS, REPORT_AUDIT } from './words/file';
import { UNUSED_AS } from './words/rests';

type Rows = readonly (readonly string[])[];

const figures = (figure: Figure) =>
  figure.known ? [figure.value, figure.low, figure.high].map((value) => value.toFixed(3)) : ['', '', ''];

const part = (some: number, all: number) => (all === 0 ? '' : (some / all).toFixed(3));

function useRows({ use }: Report): Rows {
  const weeks = use.weeks.map(({ fromDay }) => FILE_HEADINGS.week(fromDay));
  const rows = use.rows.map((row) => [
    row.name,
    ...[row.sits, row.mornings, row.evenings].map(String),
    row.days.at(-1) ?? '',
    row.meanPressure.toFixed(3),
    row.peakPressure.toFixed(3),
    row.peakDay ?? '',
    ...row.byWeek.map(String),
  ]);
  return [[...FILE_HEADINGS.use, ...weeks], ...rows];
}

function pressureRows({ use }: Report): Rows {
  const rows = use.rows.flatMap(({ name, pressure }) =>
    use.days.map((day, index) => [day, name, (pressure[index] ?? 0).toFixed(3)]),
  );
  return [FILE_HEADINGS.pressure, ...rows];
}

function restRows({ rests }: Report): Rows {
  const brokenOn = (standId: string) =>
    rests.broken
      .filter((rest) => rest.standId === standId)
      .map(({ day }) => day)
      .join('; ');
  const rows = rests.rows.map((row) => [
    row.name,
    ...[row.restDays, row.times, row.kept].map(String),
    row.least === null ? '' : String(row.least),
    brokenOn(row.standId),
  ]);
  return [FILE_HEADINGS.rests, ...rows];
}

function unusedRows({ unused }: Report): Rows {
  const rows = unused.map((line) => [
    line.name,
    UNUSED_AS[line.what],
    String(line.sits),
    line.lastDay ?? '',
    String(line.closedDays),
    line.drawnOn ?? '',
  ]);
  return [FILE_HEADINGS.unused, ...rows];
}

function memberRows({ members }: Report): Rows {
  const rows = members.rows.map((row) => [
    row.name,
    ...[row.sits, row.judged, row.good].map(String),
    part(row.good, row.judged),
    part(row.good, members.good),
  ]);
  return [FILE_HEADINGS.members, ...rows];
}

function bumpRows({ bumps }: Report): Rows {
  const row = (group: string, name: string, wind: string, { sits, bumped, share }: BumpCount) => [
    group,
    name,
    wind,
    ...[sits, bumped, sits - bumped].map(String),
    ...figures(share),
  ];
  return [
    FILE_HEADINGS.bumps,
    row(FILE_GROUPS.all, FILE_GROUPS.all, '', bumps.all),
    ...bumps.winds.map(({ wind, count }) => row(FILE_GROUPS.wind, FILE_GROUPS.all, wind, count)),
    row(FILE_GROUPS.arc, FILE_GROUPS.inArc, '', bumps.inArc),
    row(FILE_GROUPS.arc, FILE_GROUPS.outOfArc, '', bumps.outOfArc),
    ...bumps.rows.flatMap(({ name, count, winds }) => [
      row(FILE_GROUPS.stand, name, '', count),
      ...winds.map(({ wind, count: own }) => row(FILE_GROUPS.stand, name, wind, own)),
    ]),
  ];
}

function deerRows({ deer }: Report): Rows {
  return [
    TABLE_FILE_HEADINGS,
    tableRow(FILE_GROUPS.all, { key: 'all', label: FILE_GROUPS.all, indices: deer.total }),
    ...deer.byStand.map((group) => tableRow(FILE_GROUPS.stand, group)),
    ...deer.byMonth.map((group) => tableRow(FILE_GROUPS.month, group)),
  ];
}

function harvestRows({ harvest }: Report): Rows {
  if (!harvest) throw notFound();
  const rows = harvest.quotas.map(({ quota, taken, left, met }) => [
    quotaText(quota),
    ...[taken, quota.most, left].map(String),
    met ? FILE_GROUPS.yes : FILE_GROUPS.no,
  ]);
  return [FILE_HEADINGS.harvest, ...rows];
}

function hourRows({ hours }: Report): Rows {
  if (!hours) throw notFound();
  const rows = hours.rows.map((row) => [row.name, ...[row.onDays, row.forChores, row.total].map(String)]);
  return [FILE_HEADINGS.hours, ...rows];
}

const ROWS: Record<ReportPart, (report: Report) => Rows> = {
  use: useRows,
  pressure: pressureRows,
  rests: restRows,
  unused: unusedRows,
  members: memberRows,
  bumps: bumpRows,
  deer: deerRows,
  harvest: harvestRows,
  hours: hourRows,
};

/** One part of the report as CSV, as the reader sees it. That it was taken out is put on record. */
export async function exportReport(
  scope: ClubScope,
  ask: ReportAsk & { part: ReportPart },
  now: number,
): Promise<{ name: string; csv: string }> {
  const report = await readReport(scope, ask, now);
  const rows = ROWS[ask.part](report);
  const { season, label, fromDay, toDay } = report.period;
  await write((tx) =>
    audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'report.exported',
        subjectType: 'season',
        subjectId: season,
        summary: REPORT_AUDIT.exported(ask.part, label),
        detail: { part: ask.part, fromDay, toDay },
      },
      now,
    ),
  );
  return { name: `report-${ask.part}-${scope.club.slug}-${fromDay}-to-${toDay}.csv`, csv: toCsv(rows) };
}
