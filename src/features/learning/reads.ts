import { dayOf, formatDay } from '@/core/day-time';
import type { SitOutcome } from '@/core/learning/learning-types';
import { type Proposal, proposeAdjustments } from '@/core/learning/propose-adjustments';
import { type Reliability, reliabilityOf } from '@/core/learning/reliability';
import type { ReadFrom } from '@/db/client';
import { listStands } from '@/features/ground/data';
import type { ClubScope } from '@/server/scope';
import { listAdjustments, listOutcomes } from './learning-data';
import { adjustmentText } from './words';

export async function loadOutcomes(scope: ClubScope, from?: ReadFrom): Promise<SitOutcome[]> {
  const rows = await listOutcomes(scope, from);
  return rows.map(({ bumped, ...one }) => ({ ...one, clean: Number(bumped) === 0 }));
}

/** As it is shown and applied: whole points. */
export function wholePoints(proposal: Proposal): number {
  return Math.round(proposal.points) + 0;
}

export interface ProposalView {
  standId: string;
  standName: string;
  sits: number;
  clean: number;
  predicted: number;
  points: number;
  low: number;
  high: number;
  sure: boolean;
  /** What holds now; 0: nothing. */
  holds: number;
}

export interface LearningView {
  reliability: Reliability;
  proposals: ProposalView[];
  history: {
    id: string;
    standId: string;
    standName: string;
    points: number;
    sits: number;
    text: string;
    holds: boolean;
  }[];
}

/** Predictions held against the log, and what the log asks of each stand. */
export async function readLearning(scope: ClubScope): Promise<LearningView> {
  const { zone } = scope.club;
  const [outcomes, adjustments, stands] = await Promise.all([
    loadOutcomes(scope),
    listAdjustments(scope),
    listStands(scope),
  ]);
  const names = new Map(stands.map(({ id, name }) => [id, name]));
  const holding = new Map(
    adjustments.filter(({ row }) => row.endedAt === null).map(({ row }) => [row.standId, row.points]),
  );
  const on = (at: number) => formatDay(dayOf(at, zone), true);
  return {
    reliability: reliabilityOf(outcomes),
    proposals: proposeAdjustments(outcomes)
      .filter(({ standId }) => names.has(standId))
      .map((one) => ({
        standId: one.standId,
        standName: names.get(one.standId) ?? '',
        sits: one.sits,
        clean: one.clean,
        predicted: Math.round(one.predicted),
        points: wholePoints(one),
        low: Math.round(one.lowPoints) + 0,
        high: Math.round(one.highPoints) + 0,
        sure: one.sure,
        holds: holding.get(one.standId) ?? 0,
      }))
      .sort((a, b) => Math.abs(b.points) - Math.abs(a.points) || a.standName.localeCompare(b.standName)),
    history: adjustments.map(({ row, standName, appliedByName, endedByName }) => {
      const ended = row.endedAt === null ? null : { by: endedByName, on: on(row.endedAt) };
      return {
        id: row.id,
        standId: row.standId,
        standName,
        points: row.points,
        sits: row.sits,
        text: adjustmentText({
          points: row.points,
          low: Math.round(row.lowPoints),
          high: Math.round(row.highPoints),
          sits: row.sits,
          by: appliedByName,
          on: on(row.appliedAt),
          ended,
        }),
        holds: row.endedAt === null,
      };
    }),
  };
}
