import { type ByLot, giniByLot, sharedAs } from '@/core/report/by-lot';
import { type GoodSits, goodSits } from '@/core/report/good-sits';
import { type MemberShare, shareOut } from '@/core/report/sharing';
import { windowsHeld } from '@/features/bookings/words/sits';
import type { ClubScope } from '@/server/scope';
import type { ReportRows } from '../load-rows';

export interface MemberRow extends MemberShare {
  name: string;
  /** The reader's own. */
  own: boolean;
  /** Of all good sits, 0-1; null: there was none. */
  shareOfGood: number | null;
}

export interface MembersPart {
  by: GoodSits['by'];
  atLeast: number | null;
  sits: number;
  judged: number;
  good: number;
  /** Judged by what their stand's other sits were worth. */
  byStand: number;
  /** Members with a sit on their count, and those of the club now without one. */
  sat: number;
  neverSat: number;
  ofSits: number | null;
  ofGood: number | null;
  /** The same figure by luck alone, and how it compares; null: nothing to share out. */
  luck: (ByLot & { as: ReturnType<typeof sharedAs> }) | null;
  /** Officers see all rows, a member only the own one. */
  rows: MemberRow[];
  all: boolean;
}

export function readMembers(scope: ClubScope, rows: ReportRows): MembersPart {
  const stands = new Map(rows.stands.map((stand) => [stand.id, stand]));
  const found = goodSits(
    rows.sits.map(({ id, standId, windows, score }) => {
      const stand = stands.get(standId);
      return { id, standId, windows, score, prime: windowsHeld(windows).every((w) => stand?.[w] === 'prime') };
    }),
  );
  const shared = shareOut(
    rows.sits.map(({ id, countsOn }) => ({
      memberId: countsOn,
      judged: found.judged.has(id),
      good: found.good.has(id),
    })),
  );
  const sat = new Set(shared.members.map(({ memberId }) => memberId));
  const lot = giniByLot(
    shared.members.map(({ judged }) => judged),
    found.good.size,
  );
  const all = scope.can('report.read_all');
  const own = scope.member.id;
  return {
    by: found.by,
    atLeast: found.atLeast,
    sits: rows.sits.length,
    judged: found.judged.size,
    good: found.good.size,
    byStand: found.byStand,
    sat: sat.size,
    neverSat: rows.hunters.filter((id) => !sat.has(id)).length,
    ofSits: shared.ofSits,
    ofGood: shared.ofGood,
    luck: lot && shared.ofGood !== null ? { ...lot, as: sharedAs(shared.ofGood, lot) } : null,
    rows: shared.members
      .filter(({ memberId }) => all || memberId === own)
      .map((share) => ({
        ...share,
        name: rows.names.get(share.memberId) ?? '',
        own: share.memberId === own,
        shareOfGood: found.good.size === 0 ? null : share.good / found.good.size,
      })),
    all,
  };
}
