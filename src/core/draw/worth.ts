/** What a stand is worth to a member. All of it is our choice; an admin sees it beside the draw. */
export interface WorthRules {
  /**
   * The first stand at all that a member is given. Twice the second and the best choice together, so that nobody is given
   * a second one which a member without any could have had, even if the first in line counts double the last.
   */
  first: number;
  /** The second; each later one half of the one before it. */
  second: number;
  firstChoice: number;
  /** Each later choice adds this share of the one before it. */
  eachLater: number;
}

export const DEFAULT_WORTH: WorthRules = { first: 300, second: 50, firstChoice: 100, eachLater: 0.75 };

/** Sit score, 0-100, used for a stand of which none is known. */
const UNKNOWN_SCORE = 50;

export interface DrawEntry {
  /** Stands in the order wanted. */
  choices: readonly string[];
  /** Takes any other stand, the better by its sit score the rather. */
  anyByScore: boolean;
}

/** What a stand's place among the wishes is worth, before the turn in line counts; null: not asked for. */
export function worthOf(
  entry: DrawEntry,
  standId: string,
  score: number | null,
  rules: WorthRules = DEFAULT_WORTH,
): number | null {
  const rank = entry.choices.indexOf(standId);
  const choice = (at: number) => rules.firstChoice * rules.eachLater ** at;
  if (rank >= 0) return choice(rank);
  if (!entry.anyByScore) return null;
  return (choice(entry.choices.length) * (score ?? UNKNOWN_SCORE)) / 100;
}

/** What a member's first, second and later stands add besides, for so many slots. */
export function stepsOf(slots: number, rules: WorthRules = DEFAULT_WORTH): number[] {
  return Array.from({ length: slots }, (_, n) => (n === 0 ? rules.first : rules.second / 2 ** (n - 1)));
}

/** What a place in line multiplies worth by: 2 for the first of many, 1 for the last. `turn` counts from 0. */
export function turnWeight(turn: number, members: number): number {
  return members <= 1 ? 1 : 1 + (members - 1 - turn) / (members - 1);
}
