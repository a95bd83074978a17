/** A sit as it is judged. */
export interface JudgedSit {
  id: string;
  standId: string;
  /** 'morning', 'evening' or 'all_day'. */
  windows: string;
  /** Sit score kept as its window began, 0-100; null: none was. */
  score: number | null;
  /** The steward rates the stand prime for it. */
  prime: boolean;
}

export interface GoodSits {
  /** score: the kept scores; rating: the steward's ratings, where too few scores were kept. */
  by: 'score' | 'rating';
  /** Least score of a good sit; null when judged by rating. */
  atLeast: number | null;
  good: ReadonlySet<string>;
  judged: ReadonlySet<string>;
  /** Of the judged, those held to be worth what their stand's other sits were. */
  byStand: number;
}

/** The better third are the good ones. Our choice. */
const GOOD_SHARE = 1 / 3;
/** With fewer kept scores a third of them says little. Our choice. */
export const LEAST_SCORES = 12;

function means(sits: readonly JudgedSit[], keyOf: (sit: JudgedSit) => string): Map<string, number> {
  const sums = new Map<string, { sum: number; count: number }>();
  for (const sit of sits) {
    if (sit.score === null) continue;
    const { sum, count } = sums.get(keyOf(sit)) ?? { sum: 0, count: 0 };
    sums.set(keyOf(sit), { sum: sum + sit.score, count: count + 1 });
  }
  return new Map([...sums].map(([key, { sum, count }]) => [key, sum / count]));
}

/**
 * Which sits were good ones: those worth as much as the better third of the kept scores. A sit without a score is worth the
 * mean of its stand's in the same window, else of its stand's; where its stand has none it is not judged.
 */
export function goodSits(sits: readonly JudgedSit[]): GoodSits {
  const scores = sits.flatMap(({ score }) => score ?? []).sort((a, b) => b - a);
  if (scores.length < LEAST_SCORES) {
    const good = new Set(sits.filter(({ prime }) => prime).map(({ id }) => id));
    return { by: 'rating', atLeast: null, good, judged: new Set(sits.map(({ id }) => id)), byStand: 0 };
  }
  const atLeast = scores[Math.ceil(scores.length * GOOD_SHARE) - 1] ?? 0;
  const inWindow = (sit: JudgedSit) => `${sit.standId} ${sit.windows}`;
  const ofWindow = means(sits, inWindow);
  const ofStand = means(sits, ({ standId }) => standId);
  const worth = (sit: JudgedSit) => sit.score ?? ofWindow.get(inWindow(sit)) ?? ofStand.get(sit.standId) ?? null;
  const judged = sits.filter((sit) => worth(sit) !== null);
  return {
    by: 'score',
    atLeast,
    good: new Set(judged.filter((sit) => (worth(sit) ?? 0) >= atLeast).map(({ id }) => id)),
    judged: new Set(judged.map(({ id }) => id)),
    byStand: judged.filter(({ score }) => score === null).length,
  };
}
