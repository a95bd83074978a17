import type { Allotment, Given } from '@/core/draw/allotment';
import { whyNot } from '@/core/draw/explain-result';
import type { EntryRow } from './draws-data';

const ORDINALS = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth'];

export interface TellInput {
  allotment: Allotment;
  given: Given;
  members: { name: string; entry: EntryRow; points: number; turn: number }[];
  stands: { id: string; name: string }[];
  /** By member and stand: the rule of booking that forbids it. */
  ruleTexts: (string | null)[][];
}

const pointWords = (points: number) => `${points} ${points === 1 ? 'point' : 'points'}`;

/** What came of each member's wishes, in sentences. */
export function tellResults({ allotment, given, members, stands, ruleTexts }: TellInput): string[][] {
  const who = (index: number) => {
    const other = members[index];
    return other ? `${other.name} (${pointWords(other.points)}, number ${other.turn} in line)` : 'another member';
  };
  return members.map(({ entry, points, turn }, member) => {
    const got = given[member] ?? null;
    const gotId = got === null ? null : stands[got]?.id;
    const rank = gotId === null ? -1 : entry.choices.indexOf(gotId ?? '');
    const above = rank < 0 ? entry.choices : entry.choices.slice(0, rank);
    const gave =
      got === null ? 'no stand' : rank < 0 ? 'a stand left to the score' : `the ${ORDINALS[rank] ?? 'later'} choice`;
    const entries = `${points + 1} ${points === 0 ? 'entry' : 'entries'}`;
    const head = `${pointWords(points)}, so ${entries}: number ${turn} of ${members.length} in line, given ${gave}.`;
    const why = above.map((id, at) => {
      const stand = stands.findIndex((one) => one.id === id);
      const name = stands[stand]?.name ?? 'A stand no longer in use';
      const lead = `The ${ORDINALS[at] ?? 'later'} choice, ${name},`;
      if (stand < 0) return `${lead} could not be given.`;
      const reason = whyNot(allotment, given, { member, stand, ruleText: ruleTexts[member]?.[stand] ?? null });
      if (reason.kind === 'rule') return `${lead} is against a rule. ${reason.text}`;
      if (reason.kind === 'taken') return `${lead} went to ${who(reason.by)}.`;
      if (reason.kind === 'blocked') {
        const other = stands[given[reason.by] ?? -1]?.name ?? 'another stand';
        return `${lead} is too near ${other}, or on the way to it, which went to ${who(reason.by)}.`;
      }
      return `${lead} would have left others worse off by more.`;
    });
    return [head, ...why];
  });
}
