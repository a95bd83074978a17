const ORDINALS = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth'];
const ordinal = (rank: number) => ORDINALS[rank] ?? 'later';

const points = (count: number) => `${count} ${count === 1 ? 'point' : 'points'}`;

interface Holder {
  name: string;
  points: number;
  turn: number;
}
const holder = (other: Holder) => `${other.name} (${points(other.points)}, number ${other.turn} in line)`;

/** Why a member was given what was given, in sentences. */
export const RESULT_WORDS = {
  head: (had: number, turn: number, members: number, gave: string) =>
    `${points(had)}, so ${had + 1} ${had === 0 ? 'entry' : 'entries'}: number ${turn} of ${members} in line, given ${gave}.`,
  gaveNothing: 'no stand',
  gaveByScore: 'a stand left to the score',
  gaveChoice: (rank: number) => `the ${ordinal(rank)} choice`,
  gone: (rank: number) => `The ${ordinal(rank)} choice is a stand no longer in use.`,
  rule: (rank: number, stand: string, rule: string) =>
    `The ${ordinal(rank)} choice, ${stand}, is against a rule. ${rule}`,
  taken: (rank: number, stand: string, by: Holder) => `The ${ordinal(rank)} choice, ${stand}, went to ${holder(by)}.`,
  tooNear: (rank: number, stand: string, other: string, by: Holder) =>
    `The ${ordinal(rank)} choice, ${stand}, is too near ${other}, or on the way to it, which went to ${holder(by)}.`,
  rests: (rank: number, stand: string, when: string, by: Holder) =>
    `The ${ordinal(rank)} choice, ${stand}, has to rest between the days: it went to ${holder(by)} for ${when}.`,
  restsByOwn: (rank: number, stand: string, when: string) =>
    `The ${ordinal(rank)} choice, ${stand}, has to rest between the days: the same member has it for ${when}.`,
  limit: (rank: number, stand: string) =>
    `The ${ordinal(rank)} choice, ${stand}, would be more than the club allows a member, a stand or its guests.`,
  total: (rank: number, stand: string) =>
    `The ${ordinal(rank)} choice, ${stand}, would have left others worse off by more.`,
  /** Of the stands left to the score, how many could not be had, and why. */
  noneByScore: (of: { taken: number; blocked: number; rule: number; other: number }) => {
    const parts = [
      of.taken > 0 ? `${of.taken} went to others` : null,
      of.blocked > 0 ? `${of.blocked} must rest, or lie too near a stand given or on the way to it` : null,
      of.rule > 0 ? `${of.rule} ${of.rule === 1 ? 'is' : 'are'} against a rule` : null,
      of.other > 0 ? `${of.other} would have left others worse off or been more than is allowed` : null,
    ].filter((part) => part !== null);
    return `Of the stands left to the score: ${parts.join('; ')}.`;
  },
  swapped: (name: string, before: string) => `Swapped since with ${name}, who has ${before}.`,
} as const;

export const RESULT_LIST_WORDS = {
  you: (name: string) => `${name} (you)`,
  noStand: 'no stand',
  goneStand: 'A stand no longer in use',
  withGuests: (names: string[]) => `with ${names.join(', ')}`,
  gone: 'Given up since',
  giveBack: 'Give it back',
  giveBackTitle: (stand: string) => `Give back ${stand}`,
  givenBack: (stand: string) => `${stand} is free again`,
  giveBackText: 'Your sit is cancelled and the stand is free for others. Your points stay as the draw left them.',
  take: 'Take the swap',
  takeAbout: (name: string) => `with ${name}`,
  takeTitle: (own: string, other: string) => `Swap ${own} for ${other}`,
  taken: (stand: string) => `You have ${stand}`,
  takeText: (name: string, other: string, own: string) =>
    `${name} offers ${other} for ${own}. Both sits change hands at once, if every rule allows it.`,
  offered: 'Swap offered',
  offer: 'Offer a swap',
  offerAbout: (name: string) => `to ${name}`,
  offerTitle: (own: string, other: string) => `Offer ${own} for ${other}`,
  offerText: (name: string) => `${name} sees the offer on this page and may take it.`,
} as const;
