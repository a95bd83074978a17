export const HINDCAST_WORDS = {
  allCovered: 'Every wind that blew is covered by some stand.',
  uncovered: (winds: string[]) => `No stand covers: ${winds.join(', ')}.`,
  judged: (judged: number, windows: number, calm: string) =>
    `${judged} of ${windows} windows had enough wind records; ${calm} of half hours were calm or variable.`,
  standHeadings: ['Stand', 'mornings', 'evenings', 'share', 'arcs'],
  windHeadings: ['Wind', 'blew', 'stands'],
  noStand: (windows: number) => `${windows} windows had no stand for their wind.`,
} as const;
