/**
 * Groups of things of which each two stand in each other's way, so many that every such pair is in at least one group and
 * none of the groups could take in one more. `inWay[a][b]` is the same as `inWay[b][a]`; nothing stands in its own way.
 */
export function coverCliques(inWay: readonly (readonly boolean[])[]): number[][] {
  const pairKey = (a: number, b: number) => (a < b ? `${a} ${b}` : `${b} ${a}`);
  const covered = new Set<string>();
  const cliques: number[][] = [];
  inWay.forEach((row, a) => {
    row.forEach((pair, b) => {
      if (b <= a || !pair || covered.has(pairKey(a, b))) return;
      const clique = growClique(inWay, [a, b], (one, other) => covered.has(pairKey(one, other)));
      for (const one of clique) for (const other of clique) if (one < other) covered.add(pairKey(one, other));
      cliques.push(clique);
    });
  });
  return cliques;
}

/** Takes in, as long as there is one, whatever brings the most pairs not covered yet. */
function growClique(
  inWay: readonly (readonly boolean[])[],
  start: number[],
  isCovered: (a: number, b: number) => boolean,
): number[] {
  const clique = [...start];
  for (;;) {
    let next: number | null = null;
    let most = -1;
    for (let one = 0; one < inWay.length; one++) {
      if (clique.includes(one) || !clique.every((member) => inWay[one]?.[member])) continue;
      const fresh = clique.filter((member) => !isCovered(one, member)).length;
      if (fresh > most) [next, most] = [one, fresh];
    }
    if (next === null) return clique.sort((a, b) => a - b);
    clique.push(next);
  }
}
