import { formatClock } from '@/core/day-time';
import type { Figure } from '@/core/indices';
import { write } from '@/db/client';
import { SIT_WINDOW_WORDS } from '@/features/bookings/words/sits';
import { toCsv } from '@/lib/csv';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';
import { type IndexGroup, listSightings, readSightings } from './sightings-reads';
import type { SightingsAsk } from './sightings-schema';
import {
  TABLE_FILE_GROUPS as GROUPS,
  LOG_FILE_HEADINGS,
  SIGHTINGS_AUDIT,
  TABLE_FILE_HEADINGS,
} from './words/sightings';

async function logRows(scope: ClubScope, ask: SightingsAsk, now: number): Promise<string[][]> {
  const { zone } = scope.club;
  const { sits } = await listSightings(scope, ask, now);
  const rows = sits.map(({ log, ...sit }) => [
    sit.day,
    SIT_WINDOW_WORDS[sit.windows],
    sit.standName,
    sit.memberName,
    formatClock(log.startAt, zone),
    formatClock(log.endAt, zone),
    sit.hours.toFixed(2),
    ...[log.antleredBucks, log.does, log.fawns, log.unknown].map(String),
    ...[log.bumpedIn, log.bumpedSitting, log.bumpedOut].map(String),
    log.bumpedWhere,
    log.shot,
    log.hitPlace ?? '',
    log.followUp ?? '',
    log.notes,
  ]);
  return [LOG_FILE_HEADINGS, ...rows];
}

/** A figure that cannot be given is blank in a file. */
const cells = (figure: Figure) =>
  figure.known ? [figure.value, figure.low, figure.high].map((value) => value.toFixed(3)) : ['', '', ''];

export function tableRow(group: string, { label, indices }: IndexGroup): string[] {
  const { sits, zeroSits, hours, seen, perHour, doesPerBuck, fawnsPerDoe, unknownShare, bumpedSits, bumpedShare } =
    indices;
  return [
    group,
    label,
    String(sits),
    String(zeroSits),
    hours.toFixed(2),
    ...[seen.all, seen.bucks, seen.does, seen.fawns, seen.unknown, bumpedSits].map(String),
    ...[perHour.all, perHour.bucks, perHour.does, perHour.fawns, perHour.unknown].flatMap(cells),
    ...[doesPerBuck, fawnsPerDoe, unknownShare, bumpedShare].flatMap(cells),
  ];
}

async function tableRows(scope: ClubScope, ask: SightingsAsk, now: number): Promise<string[][]> {
  const { total, byStand, byWindow, byMonth } = await readSightings(scope, ask, now);
  return [
    TABLE_FILE_HEADINGS,
    tableRow(GROUPS.season, { key: 'all', label: GROUPS.all, indices: total }),
    ...byStand.map((group) => tableRow(GROUPS.stand, group)),
    ...byWindow.map((group) => tableRow(GROUPS.window, group)),
    ...byMonth.map((group) => tableRow(GROUPS.month, group)),
  ];
}

/** A season's logs or indices as CSV, of the sits that the reader may see. That they were taken out is put on record. */
export async function exportSightings(
  scope: ClubScope,
  ask: SightingsAsk & { what: 'logs' | 'tables' },
  now: number,
): Promise<{ name: string; csv: string }> {
  const { year, own } = await listSightings(scope, ask, now);
  const rows = ask.what === 'logs' ? await logRows(scope, ask, now) : await tableRows(scope, ask, now);
  const whose = own ? 'own' : 'club';
  await write((tx) =>
    audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'sightings.exported',
        subjectType: 'season',
        subjectId: String(year.year),
        summary: SIGHTINGS_AUDIT.exported(year.label, own),
        detail: { what: ask.what, whose },
      },
      now,
    ),
  );
  return { name: `sightings-${ask.what}-${scope.club.slug}-${year.label}.csv`, csv: toCsv(rows) };
}
