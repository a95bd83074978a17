import type { ClubScope } from '@/server/scope';
import { loadRows, type ReportRows } from './load-rows';
import { type BumpsPart, readBumps } from './parts/bumps';
import { type DeerPart, readDeer } from './parts/deer';
import { type HarvestPart, readHarvestPart } from './parts/harvest';
import { type HoursPart, readHours } from './parts/hours';
import { type MembersPart, readMembers } from './parts/members';
import { type RestsPart, readRests } from './parts/rests';
import { readUnused, type UnusedLine } from './parts/unused';
import { readUse, type UsePart } from './parts/use';
import type { ReportAsk } from './report-schema';

export interface Report extends Pick<ReportRows, 'period' | 'choices' | 'year' | 'kept'> {
  sits: number;
  /** Sits with neither a sign-in nor a log: nobody knows whether anybody was there. */
  unproven: number;
  use: UsePart;
  rests: RestsPart;
  unused: UnusedLine[];
  members: MembersPart;
  bumps: BumpsPart;
  deer: DeerPart;
  /** null: not for this reader. */
  harvest: HarvestPart | null;
  hours: HoursPart | null;
}

/** A season in figures, as far as the reader may see it. */
export async function readReport(scope: ClubScope, ask: ReportAsk, now: number): Promise<Report> {
  const rows = await loadRows(scope, ask, now);
  const use = await readUse(scope, rows);
  const { period, choices, year, kept, sits } = rows;
  return {
    period,
    choices,
    year,
    kept,
    sits: sits.length,
    unproven: sits.filter(({ signedIn, hasLog }) => !signedIn && !hasLog).length,
    use,
    rests: readRests(scope, rows, use),
    unused: await readUnused(scope, rows, use),
    members: readMembers(scope, rows),
    bumps: readBumps(rows),
    deer: readDeer(rows),
    harvest: scope.can('harvest.read') ? await readHarvestPart(scope, rows) : null,
    hours: scope.can('chores.read') ? await readHours(scope, rows) : null,
  };
}
