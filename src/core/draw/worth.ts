/** What a stand is worth to a member. All of it is our choice; an admin sees it beside the draw. */
export interface WorthRules {
  /** Any stand at all: twice what the best choice adds, so that one member more comes before a better choice. */
  anyStand: number;
  firstChoice: number;
  /** Each later choice adds this share of the one before it. */
  eachLater: number;
}

export const DEFAULT_WORTH: WorthRules = { anyStand: 200, firstChoice: 100, eachLater: 0.75 };

/** Sit score, 0-100, used for a stand of which none is known. */
const UNKNOWN_SCORE = 50;

export interface DrawEntry {
  /** Stands in the order wanted. */
  choices: readonly string[];
  /** Takes any other stand, the better by its sit score the rather. */
  anyByScore: boolean;
}

/** Worth of a stand to one member before his turn in line counts; null: not asked for. */
export function worthOf(
  entry: DrawEntry,
  standId: string,
  score: number | null,
  rules: WorthRules = DEFAULT_WORTH,
): number | null {
  const rank = entry.choices.indexOf(standId);
  const choice = (at: number) => rules.firstChoice * rules.eachLater ** at;
  if (rank >= 0) return rules.anyStand + choice(rank);
  if (!entry.anyByScore) return null;
  return rules.anyStand + (choice(entry.choices.length) * (score ?? UNKNOWN_SCORE)) / 100;
}

/** What a place in line multiplies worth by: near 2 for the first of many, 1 for the last. `turn` counts from 0. */
export function turnWeight(turn: number, members: number): number {
  return members <= 1 ? 1 : 1 + (members - 1 - turn) / (members - 1);
}
