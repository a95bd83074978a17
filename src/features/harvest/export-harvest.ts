import { formatClock } from '@/core/day-time';
import { write } from '@/db/client';
import { WEAPON_WORDS } from '@/features/ground/words/kinds';
import { seasonYear } from '@/features/logs/season-years';
import { toCsv } from '@/lib/csv';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';
import { listSheets, type Sheet } from './harvests-data';
import { HARVEST_FILE_HEADINGS, HARVEST_FILE_WORDS } from './words/season';
import { HARVEST_AUDIT } from './words/sheet';

const number = (value: number | null, decimals = 1) => (value === null ? '' : String(Number(value.toFixed(decimals))));
const yesNo = (value: boolean | null) => (value === null ? '' : value ? HARVEST_FILE_WORDS.yes : HARVEST_FILE_WORDS.no);

function cells({ sheet, memberName, standName }: Sheet, zone: string): string[] {
  return [
    sheet.day,
    formatClock(sheet.takenAt, zone),
    memberName,
    sheet.guestName,
    sheet.sex,
    yesNo(sheet.antlered),
    sheet.age ?? '',
    sheet.ageMethod ?? '',
    number(sheet.dressedKg),
    number(sheet.liveKg),
    number(sheet.pointsLeft),
    number(sheet.pointsRight),
    number(sheet.insideSpreadMm),
    number(sheet.mainBeamLeftMm),
    number(sheet.mainBeamRightMm),
    yesNo(sheet.lactating),
    standName ?? '',
    sheet.place,
    WEAPON_WORDS[sheet.weapon],
    sheet.notes,
  ];
}

/** The sheets of a season as CSV, in kilograms and millimetres. That they were taken out is put on record. */
export async function exportHarvest(
  scope: ClubScope,
  year: number,
  now: number,
): Promise<{ name: string; csv: string }> {
  const season = seasonYear(year);
  const sheets = await write(async (tx) => {
    const found = await listSheets(scope, season, tx);
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'harvest.exported',
        subjectType: 'season',
        subjectId: String(year),
        summary: HARVEST_AUDIT.exported(found.length, season.label),
      },
      now,
    );
    return found;
  });
  const rows = sheets.map((sheet) => cells(sheet, scope.club.zone));
  return { name: `harvest-${scope.club.slug}-${season.label}.csv`, csv: toCsv([HARVEST_FILE_HEADINGS, ...rows]) };
}
