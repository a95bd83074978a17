/** Texts of the board's page and of its lists. */

export const BOARD_PAGE_WORDS = {
  title: 'Board',
  lead: "Who is on the ground, and who is booked where today and tomorrow, by the club's clock.",
  mySits: 'My sits',
  gateSheet: 'Gate sheet',
  noRescueTitle: 'Windrest is no rescue service',
  noRescue:
    'It mails those the club and the member have named, and sends nobody. When somebody is missing, call the emergency number.',
} as const;

export const BOARD_WORDS = {
  old: 'This may be old',
  overdueTitle: (names: string[]) =>
    names.length === 1 ? `${names[0]} is overdue` : `${names.length} people are overdue`,
  overdue:
    'Call first: most often a sign-out was forgotten. Then look for the vehicle where it was parked. When somebody may be hurt, call the emergency number.',
  onGround: 'On the ground now',
  nobodyInTitle: 'Nobody is signed in',
  nobodyIn: 'Whoever signs in stands here until they sign out.',
  inCaption: 'Who is signed in now',
  dayTitle: (title: string, dayText: string) => `${title}, ${dayText}`,
  nobodyElse: 'Nobody else',
  nobodyBooked: 'Nobody is booked',
  showSoon: 'Sits show here as soon as they are booked.',
  dayCaption: (dayText: string) => `Sits of ${dayText}`,
} as const;

export const BOARD_ROW_WORDS = {
  who: 'Who',
  state: 'State',
  stand: 'Stand',
  when: 'When',
  wayIn: 'Way in',
  guests: 'Guests',
  doings: 'Do',
  you: 'You',
  none: 'None',
  backBy: (time: string) => `Back by ${time}`,
  whenText: (window: string, time: string) => `${window}, ${time}`,
  way: (way: { wayIn: string | null; parking: string | null; vehicle: string }) =>
    [
      way.wayIn ?? 'Way not said',
      ...(way.parking ? [`parked at ${way.parking}`] : []),
      ...(way.vehicle ? [way.vehicle] : []),
    ].join(', '),
  outNotSent: 'Signed out here, not sent yet',
  inNotSent: 'Signed in here, not sent yet',
} as const;

/** What the buttons of a row say, and whose they are. */
export const BOARD_BUTTON_WORDS = {
  signIn: 'Sign in',
  signInFor: (who: string, stand: string) => `Sign in: ${who}, ${stand}`,
  signOut: 'Sign out',
  signOutFor: (who: string, stand: string) => `Sign out: ${who}, ${stand}`,
  move: 'Back later',
  moveFor: (who: string, stand: string) => `Back later: ${who}, ${stand}`,
  share: 'Link for home',
  shareFor: (who: string, stand: string) => `Link for home: ${who}, ${stand}`,
  walkUp: 'Walk up',
} as const;
