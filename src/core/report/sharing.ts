import { gini } from '../draw/fairness';

/** A sit on a member's count; a guest's is on that of the member who answers for them. */
export interface CountedSit {
  memberId: string;
  judged: boolean;
  good: boolean;
}

export interface MemberShare {
  memberId: string;
  sits: number;
  judged: number;
  good: number;
}

export interface Sharing {
  /** Members with a sit, those with the most good ones first. */
  members: MemberShare[];
  /** Gini coefficients over these members: 0 all alike, toward 1 one has it all. null: nothing to share out. */
  ofSits: number | null;
  ofGood: number | null;
}

/** How sits, and good sits, fell to the members who sat at all. Who never sat is in neither figure. */
export function shareOut(sits: readonly CountedSit[]): Sharing {
  const members = new Map<string, MemberShare>();
  for (const { memberId, judged, good } of sits) {
    const own = members.get(memberId) ?? { memberId, sits: 0, judged: 0, good: 0 };
    members.set(memberId, {
      memberId,
      sits: own.sits + 1,
      judged: own.judged + (judged ? 1 : 0),
      good: own.good + (good ? 1 : 0),
    });
  }
  const list = [...members.values()].sort((a, b) => b.good - a.good || b.sits - a.sits);
  return { members: list, ofSits: gini(list.map((one) => one.sits)), ofGood: gini(list.map((one) => one.good)) };
}
