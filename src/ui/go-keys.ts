/** A letter for each label, the first of it that no label before it has; null where all are taken. */
export function goKeys(labels: readonly string[]): (string | null)[] {
  const taken = new Set<string>();
  return labels.map((label) => {
    const key = [...label.toLowerCase()].find((letter) => /[a-z]/.test(letter) && !taken.has(letter)) ?? null;
    if (key) taken.add(key);
    return key;
  });
}

export type KeyMeaning =
  | { do: 'list' | 'earlier' | 'later' | 'next_row' | 'row_before' | 'wait' | 'none' }
  | { go: string };

const SINGLE: Record<string, Exclude<KeyMeaning, { go: string }>['do']> = {
  '?': 'list',
  '[': 'earlier',
  ']': 'later',
  j: 'next_row',
  k: 'row_before',
  g: 'wait',
};

/** What a key means on a page; `afterG`: the one before it was g. `places` is letter to address. */
export function meaningOf(key: string, afterG: boolean, places: ReadonlyMap<string, string>): KeyMeaning {
  const address = afterG ? places.get(key) : undefined;
  return address ? { go: address } : { do: SINGLE[key] ?? 'none' };
}
