import { type QuotaState, quotaStates } from '@/core/harvest/quotas';
import { listSheets, type Sheet } from '@/features/harvest/harvests-data';
import type { ClubScope } from '@/server/scope';
import type { ReportRows } from '../load-rows';

export interface QuotaRow extends QuotaState {
  /** Members whose own count has met it; null: the quota is the club's. */
  metBy: number | null;
}

export interface HarvestPart {
  /** Taken in the period. */
  antlered: number;
  antlerless: number;
  /** Counted over the whole hunting year, whatever days the report is of. */
  quotas: QuotaRow[];
}

const deerOf = (sheets: readonly Sheet[]) =>
  sheets.map(({ sheet }) => ({
    memberId: sheet.memberId,
    antlered: sheet.antlered,
    byGuest: sheet.guestName !== '',
  }));

/** Deer taken, and how the quotas stand with the reader's own count. */
export async function readHarvestPart(scope: ClubScope, { period, year, hunters }: ReportRows): Promise<HarvestPart> {
  const sheets = await listSheets(scope, period);
  const taken = deerOf(await listSheets(scope, year));
  const { harvestQuotas } = scope.club.rules;
  const counts = hunters.map((id) => quotaStates(harvestQuotas, taken, id));
  const antlered = sheets.filter(({ sheet }) => sheet.antlered).length;
  return {
    antlered,
    antlerless: sheets.length - antlered,
    quotas: quotaStates(harvestQuotas, taken, scope.member.id).map((state, index) => ({
      ...state,
      metBy: state.quota.per === 'club' ? null : counts.filter((states) => states[index]?.met).length,
    })),
  };
}
