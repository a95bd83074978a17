const points = (count: number) => `${count} ${count === 1 ? 'point' : 'points'}`;

export const SLOT_WORDS = {
  dayWith: (day: string, windows: string[]) => `${day}, ${windows.join(' and ')}`,
  betweenDays: '; ',
} as const;

export const DRAWS_WORDS = {
  title: 'Draws',
  lead: 'For a day on which more want a stand than there are stands: rank what you would like, and the sums share them out under every rule.',
  open: 'Open a draw',
  none: 'No draw yet',
  noneForAdmin: 'Open one for a busy day: opening weekend, the first cold Saturday.',
  noneForMember: 'A club admin opens a draw for a busy day. Until then stands are booked from the list.',
} as const;

export const DRAW_STATE_WORDS = {
  cancelled: 'Called off',
  published: 'Published',
  drawn: 'Made, not published',
  openUntil: (day: string, clock: string) => `Open until ${day}, ${clock}`,
  closed: 'Closed, to be made',
} as const;

export const NEW_DRAW_WORDS = {
  title: 'Open a draw',
  lead: 'Members rank the stands until it closes. Then you make the draw, look at it and publish it: all of it is booked, or nothing.',
  noStands: 'No stands yet',
  noStandsText: 'A draw needs stands to share out.',
  toStands: 'Go to the stands',
} as const;

export const DRAW_PAGE_WORDS = {
  title: 'Draw',
  over: (club: string) => `${club}: draw`,
  cancelled: "This draw was called off. Nobody's points changed.",
  wishes: 'Your wishes',
  yourPoints: (count: number) => `You have ${points(count)}.`,
  leave: 'Leave the draw',
  left: 'You are out of the draw',
  leaveText: 'Your wishes are removed. You may enter again until it closes.',
  given: 'What each was given',
  givenIn: (window: string) => `Given for ${window}`,
  nobodyWanted: 'Nobody asked for this window.',
  admin: 'For the admin',
  publish: 'Publish',
  publishTitle: 'Publish the draw',
  published: 'Published and booked',
  publishText: 'Every stand given is booked and its member is told by mail. If one of them cannot be booked, none is.',
  make: 'Make the draw',
  makeAgain: 'Make it again',
  makeStarted: 'The draw is being made',
  makeText:
    'The sums are done apart from this page; you see how far they are. Nothing is booked and nobody but you sees the result until you publish it. The same wishes and the same seed give the same result.',
  callOff: 'Call it off',
  callOffTitle: 'Call the draw off',
  calledOff: 'Called off',
  callOffText: "Nothing is booked and nobody's points change.",
  how: 'How it is drawn',
  howText:
    'Any stand at all counts for more than a better choice, and each later choice for a quarter less than the one before it; the first in line counts double the last. The sums find the sharing out of the greatest total under every booking rule of the club, rest between the days of the draw too.',
  howMany:
    'Over several windows the first stand a member is given counts six times the second: nobody is given a second one that a member without any could have had. Guests come along to every stand given, and count by the rules for guests.',
  seed: 'Seed:',
  nobody: 'Nobody has entered yet.',
  entered: (names: string[]) => `Entered: ${names.join(', ')}.`,
} as const;

export const DRAW_READ_WORDS = {
  points: (perMiss: number, workHours: number | null, reset: boolean) => {
    const work = workHours === null ? '' : `, 1 for each ${workHours} hours of work credited`;
    const back = reset ? '; a stand given takes them back to none' : '';
    return `Points: ${perMiss} for each draw that gave nothing${work}${back}. Each point is one more entry in the lottery for the order of turns.`;
  },
  proved: 'Proved to be the best answer under every rule.',
  cutByTime: (percent: string) =>
    `The best answer found in the time allowed; a better one could be worth ${percent} % more at most. Made again it may come out otherwise.`,
  cutByNodes: (percent: string) =>
    `The best answer found in the steps allowed; a better one could be worth ${percent} % more at most.`,
  within: (percent: string) => `Within ${percent} % of the best answer there can be.`,
  fair: (seated: number, members: number, sits: number, shared: string, gini: string) =>
    `${sits} ${sits === 1 ? 'sit' : 'sits'} given; ${seated} of ${members} members have one: ${shared} (Gini ${gini}, where 0 is the same for all).`,
} as const;

export const RUN_WORDS = {
  title: 'The draw is being made',
  since: (clock: string) => `Since ${clock}.`,
  reading: 'The wishes, the rules and the stands are being looked at.',
  best: (percent: string) => `The best answer so far is at most ${percent} % from the best there can be.`,
  stop: 'Stop it',
  stopTitle: 'Stop making the draw',
  stopped: 'Stopped',
  stopText: 'The draw stays as it was. You may make it again.',
  failed: 'The draw was not made',
  done: 'The draw is made',
} as const;
