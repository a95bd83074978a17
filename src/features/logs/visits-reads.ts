import { distanceM, toLocal } from '@/core/geometry';
import { formatDistance } from '@/core/units';
import { momentText } from '@/features/clubs/words/audit-text';
import { listStands } from '@/features/ground/stands-data';
import type { ClubScope } from '@/server/scope';
import { listVisits } from './visits-data';
import { VISIT_LIST_WORDS, VISIT_WORDS } from './words/visits';

const DAY_MS = 86_400_000;
const SHOWN_DAYS = 30;

export interface VisitLine {
  id: string;
  kind: string;
  whenText: string;
  /** A stand's name, or how far from the nearest one. */
  where: string;
  memberName: string;
  bumped: number;
  notes: string;
  mayRemove: boolean;
}

/** Visits of the last month, the latest first. */
export async function listVisitLines(scope: ClubScope, now: number): Promise<VisitLine[]> {
  const { club, member } = scope;
  const rows = await listVisits(scope, now - SHOWN_DAYS * DAY_MS);
  const stands = (await listStands(scope)).map((stand) => ({ name: stand.name, at: toLocal(club, stand) }));
  const nearest = (lat: number, lon: number) => {
    const at = toLocal(club, { lat, lon });
    const [first] = stands.map((stand) => ({ name: stand.name, m: distanceM(at, stand.at) })).sort((a, b) => a.m - b.m);
    return first
      ? VISIT_LIST_WORDS.from(formatDistance(first.m, club.units), first.name)
      : VISIT_LIST_WORDS.onTheGround;
  };
  return rows.map(({ visit, standName, memberName }) => ({
    id: visit.id,
    kind: VISIT_WORDS[visit.kind],
    whenText: momentText(visit.at, club),
    where: standName ?? nearest(visit.lat, visit.lon),
    memberName: memberName ?? VISIT_LIST_WORDS.hasLeft,
    bumped: visit.bumped,
    notes: visit.notes,
    mayRemove: visit.memberId === member.id || scope.can('log.write_any'),
  }));
}
