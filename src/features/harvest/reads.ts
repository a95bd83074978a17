import { dayOf } from '@/core/day-time';
import { metText, type QuotaState, quotaStates, quotaText } from '@/core/harvest/quotas';
import { type HarvestSummary, summarizeHarvest } from '@/core/harvest/summary';
import { type SeasonYear, seasonYear, seasonYears, yearOf } from '@/features/logs/season-years';
import type { ClubScope } from '@/server/scope';
import { findFirstHarvestDay, listSheets, type Sheet } from './harvests-data';
import { type SheetLine, sheetLine } from './sheet-line';

export interface QuotaLine {
  key: string;
  text: string;
  taken: number;
  left: number;
  most: number;
  met: string | null;
}

export interface MemberCount {
  memberId: string;
  name: string;
  antlered: number;
  antlerless: number;
  byGuests: number;
}

export interface HarvestPage {
  year: SeasonYear;
  years: SeasonYear[];
  quotas: QuotaLine[];
  members: MemberCount[];
  summary: HarvestSummary;
  sheets: SheetLine[];
}

function quotaLine(state: QuotaState): QuotaLine {
  const { quota, taken, left, met } = state;
  return {
    key: `${quota.per} ${quota.deer}`,
    text: quotaText(quota),
    taken,
    left,
    most: quota.most,
    met: met ? metText(state, 'own') : null,
  };
}

function memberCounts(sheets: Sheet[]): MemberCount[] {
  const counts = new Map<string, MemberCount>();
  for (const { sheet, memberName } of sheets) {
    const { memberId } = sheet;
    const count = counts.get(memberId) ?? { memberId, name: memberName, antlered: 0, antlerless: 0, byGuests: 0 };
    if (sheet.antlered) count.antlered++;
    else count.antlerless++;
    if (sheet.guestName !== '') count.byGuests++;
    counts.set(memberId, count);
  }
  return [...counts.values()].sort((a, b) => a.name.localeCompare(b.name));
}

/** The deer of a season: quotas with the reader's own count, who took what, weights by age, and the sheets. */
export async function readHarvest(scope: ClubScope, ask: { year?: number }, now: number): Promise<HarvestPage> {
  const { club, member } = scope;
  const today = dayOf(now, club.zone);
  const year = seasonYear(ask.year ?? yearOf(today));
  const sheets = await listSheets(scope, year);
  const taken = sheets.map(({ sheet }) => ({ ...sheet, byGuest: sheet.guestName !== '' }));
  const years = seasonYears(today, await findFirstHarvestDay(scope));
  return {
    year,
    years: years.some((one) => one.year === year.year) ? years : [...years, year],
    quotas: quotaStates(club.rules.harvestQuotas, taken, member.id).map(quotaLine),
    members: memberCounts(sheets),
    summary: summarizeHarvest(taken),
    sheets: sheets.map((one) => sheetLine(scope, one)),
  };
}
