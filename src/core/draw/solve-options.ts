/** FNV-1a, 32 bits. */
function hashText(text: string): number {
  let hash = 0x811c9dc5;
  for (const char of text) hash = Math.imul(hash ^ (char.codePointAt(0) ?? 0), 0x01000193);
  return hash >>> 0;
}

/**
 * How a draw is solved: to the proven best, or until so many branches were looked at. The time is a last resort, many
 * times what the greatest draw has needed, so that the same seed gives the same answer on any machine.
 */
export function solveOptions(seed: string) {
  return { gap: 0, mostNodes: 1_000, seconds: 180, seed: hashText(seed) };
}
