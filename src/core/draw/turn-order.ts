/** FNV-1a, 32 bits. */
function hashText(text: string): number {
  let hash = 0x811c9dc5;
  for (const char of text) hash = Math.imul(hash ^ (char.codePointAt(0) ?? 0), 0x01000193);
  return hash >>> 0;
}

/** A share above 0 and below 1 that is always the same for the same text (the mixing step of MurmurHash3). */
function shareOf(text: string): number {
  let h = hashText(text);
  h = Math.imul(h ^ (h >>> 16), 0x85ebca6b);
  h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35);
  return (((h ^ (h >>> 16)) >>> 0) + 0.5) / 4294967296;
}

/**
 * The order in which members stand in line: a lottery in which each has points + 1 entries. Efraimidis and Spirakis 2006,
 * "Weighted random sampling with a reservoir": the greatest u^(1/entries) first. The same seed gives the same order,
 * whatever order the members come in. Points are 0 or more.
 */
export function turnOrder(seed: string, members: readonly { id: string; points: number }[]): string[] {
  return members
    .map(({ id, points }) => ({ id, key: Math.log(shareOf(`${seed} ${id}`)) / (points + 1) }))
    .sort((a, b) => b.key - a.key || a.id.localeCompare(b.id))
    .map(({ id }) => id);
}
