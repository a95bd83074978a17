const count = (n: number, one: string, many: string) => `${n} ${n === 1 ? one : many}`;

const range = (low: number, high: number) => `${low.toFixed(2)} to ${high.toFixed(2)}`;

export const MEMBERS_WORDS = {
  byScore: (atLeast: number) =>
    `A good sit is one of the better third by the sit score kept as its window began: ${atLeast.toFixed(0)} or more.`,
  byRating: (least: number) =>
    `Fewer than ${least} sits have a score kept from when their window began, so a good sit is one on a stand the steward rates prime for its window.`,
  byStand: (sits: number) =>
    sits === 1
      ? '1 sit without a kept score is taken for what its stand’s other sits were worth.'
      : `${sits} sits without a kept score are taken for what their stand’s other sits were worth.`,
  notJudged: (sits: number) =>
    sits === 1
      ? '1 sit is not judged: no score is kept of its stand.'
      : `${sits} sits are not judged: no score is kept of their stands.`,
  counted:
    'A guest’s sit counts on the member who answers for them. A sit shared with a guest is one sit. What was seen, what was shot and sits given up count nothing.',
  fair: (words: string, value: number, members: number) =>
    `Among the ${count(members, 'member', 'members')} who sat, the good sits are ${words}: Gini ${value.toFixed(2)}. At 0 each has the same number; the nearer to 1, the fewer hands they are in.`,
  noneGood: 'There was no good sit to share out.',
  luck: {
    by_lot: (mean: number, low: number, high: number) =>
      `Dealt out by lot among the sits that were made it would be about ${mean.toFixed(2)} (${range(low, high)} in nineteen deals of twenty), so luck and who sat how often explain it.`,
    less_even: (mean: number, low: number, high: number) =>
      `Dealt out by lot among the sits that were made it would be about ${mean.toFixed(2)} (${range(low, high)} in nineteen deals of twenty). They are in fewer hands than luck and who sat how often explain.`,
    more_even: (mean: number, low: number, high: number) =>
      `Dealt out by lot among the sits that were made it would be about ${mean.toFixed(2)} (${range(low, high)} in nineteen deals of twenty). They are shared more evenly than luck would have done it.`,
  },
  ofSits: (value: number) => `Gini of all sits, good or not: ${value.toFixed(2)}.`,
  never: (members: number) =>
    members === 1
      ? '1 member of the club did not sit and is in neither figure.'
      : `${members} members of the club did not sit and are in neither figure.`,
  ownOnly: 'You see your own line; officers see everybody’s.',
  noOwn: 'You have no sit in these days.',
} as const;

export const MEMBERS_TABLE_WORDS = {
  caption: 'Sits and good sits by member, guests’ sits on the member who answers for them',
  member: 'Member',
  sits: 'Sits',
  good: 'Good sits',
  ofOwn: 'Of own sits',
  ofAll: 'Of all good sits',
  percent: (share: number) => `${Math.round(share * 100)} %`,
  none: '–',
} as const;
