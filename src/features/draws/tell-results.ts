import type { Given } from '@/core/draw/allotment';
import { whyNot } from '@/core/draw/explain-result';
import type { LoadedDraw } from './load-draw';
import { slotName } from './slots';
import { RESULT_WORDS as WORDS } from './words/results';

export interface TellInput extends LoadedDraw {
  given: Given;
}

/** What came of each member's wishes in each slot, in sentences. */
export function tellResults(input: TellInput): string[][][] {
  const { members, given, slots, stands } = input;
  return members.map(({ entry, points, turn }, member) =>
    slots.map((_, slot) => {
      if (!entry.slots.includes(slot)) return [];
      const place = given[member]?.[slot] ?? null;
      const gotId = place === null ? null : (stands[place % stands.length]?.id ?? null);
      const rank = gotId === null ? -1 : entry.choices.indexOf(gotId);
      const gave = gotId === null ? WORDS.gaveNothing : rank < 0 ? WORDS.gaveByScore : WORDS.gaveChoice(rank);
      const above = rank < 0 ? entry.choices : entry.choices.slice(0, rank);
      const why = above.map((standId, at) => tellChoice(input, { member, slot, standId, rank: at }));
      const left = gotId === null && entry.anyByScore ? tellLeft(input, { member, slot }) : null;
      return [WORDS.head(points, turn, members.length, gave), ...why, ...(left === null ? [] : [left])];
    }),
  );
}

/** Why nothing was left by score, counted; null: every stand was among the choices. */
function tellLeft(input: TellInput, { member, slot }: { member: number; slot: number }): string | null {
  const { allotment, given, members, stands, ruleTexts } = input;
  const kinds = stands.flatMap((stand, at) => {
    if (members[member]?.entry.choices.includes(stand.id)) return [];
    const place = slot * stands.length + at;
    return [whyNot(allotment, given, { member, place, ruleText: ruleTexts[member]?.[place] ?? null }).kind];
  });
  if (kinds.length === 0) return null;
  const count = (...some: (typeof kinds)[number][]) => kinds.filter((kind) => some.includes(kind)).length;
  return WORDS.noneByScore({
    taken: count('taken'),
    blocked: count('blocked'),
    rule: count('rule'),
    other: count('limit', 'total'),
  });
}

function tellChoice(
  { allotment, given, members, slots, stands, ruleTexts }: TellInput,
  ask: { member: number; slot: number; standId: string; rank: number },
): string {
  const { member, slot, rank } = ask;
  const at = stands.findIndex((one) => one.id === ask.standId);
  const stand = stands[at]?.name;
  if (stand === undefined) return WORDS.gone(rank);
  const place = slot * stands.length + at;
  const why = whyNot(allotment, given, { member, place, ruleText: ruleTexts[member]?.[place] ?? null });
  if (why.kind === 'rule') return WORDS.rule(rank, stand, why.text);
  if (why.kind === 'limit') return WORDS.limit(rank, stand);
  if (why.kind === 'total') return WORDS.total(rank, stand);
  const by = members[why.by];
  if (!by) return WORDS.total(rank, stand);
  const holder = { name: by.name, points: by.points, turn: by.turn };
  if (why.kind === 'taken') return WORDS.taken(rank, stand, holder);
  if (why.place % stands.length !== at) {
    return WORDS.tooNear(rank, stand, stands[why.place % stands.length]?.name ?? '', holder);
  }
  const when = slotName(slots[Math.floor(why.place / stands.length)]);
  return why.by === member ? WORDS.restsByOwn(rank, stand, when) : WORDS.rests(rank, stand, when, holder);
}
