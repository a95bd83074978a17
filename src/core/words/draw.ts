export const FAIRNESS_WORDS = {
  evenly: 'shared almost evenly',
  fairly: 'shared fairly evenly',
  unevenly: 'shared unevenly',
  fewHands: 'mostly in a few hands',
} as const;
