export const SITE_WORDS = {
  description: 'Where to sit without the deer ever knowing, and who else is in the woods.',
} as const;

export const NOT_FOUND_WORDS = {
  title: 'Nothing here',
  what: 'There is no such page, or it is not open to you',
  go: 'Go on',
  why: 'Check the address. If it is a page of your club, you may be signed in with another account, or your role does not include it: ask a club admin.',
} as const;

export const HOME_WORDS = {
  heading: 'Sit where the deer never know',
  lead: 'Windrest is for deer-hunting clubs, leases and family land. Each day it tells each member where a sit alerts no deer, and who else is in the woods.',
  signUp: 'Make an account',
  signIn: 'Sign in',
  quiet: 'A quiet stand first',
  quietText:
    'Every stand of the club is ranked for the morning or the evening by the wind through the whole sit, the way in and out, the sun, and how lately people were near. The list says why, and when to leave the gate.',
  booked: 'One stand, one hunter',
  bookedText:
    'A booked sit is taken for everyone. The club’s own rules on rest days, guests, distance and seasons hold the same for all, and a refusal names its rule.',
  home: 'Everyone home',
  homeText:
    'The board shows who is booked and where. Windrest is no rescue service: tell someone where you go and when you will be back.',
} as const;
