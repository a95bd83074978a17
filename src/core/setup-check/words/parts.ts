/** 'A', 'A and B', 'A, B and C'. */
export const listText = (names: readonly string[]) =>
  names.length < 2 ? (names[0] ?? '') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;

export const PART_WORDS = {
  takeAway: (feature: string) => `Take away ${feature}`,
  wayTo: (way: string, stand: string) => `${way} to ${stand}`,
  usualWind: 'a usual wind',
} as const;
