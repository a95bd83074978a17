const counted = (n: number, one: string) => `${n} ${one}${n === 1 ? '' : 's'}`;
const on = (day: string, windows: readonly string[]) => `on ${day}, ${windows.join(' and ')}`;
const rest = (days: number) => `${days} full ${days === 1 ? 'day' : 'days'} of rest`;

/** What a rule of booking says when it forbids a sit. Days and distances come written out. */
export const GATE_WORDS = {
  ground: 'The ground',
  /** `until` null: nobody knows. */
  closed: (what: string, until: string | null, reason: string) =>
    `${what} is closed ${until === null ? 'until further notice' : `until ${until}`}${reason === '' ? '.' : `: ${reason}.`}`,
  noLaterSeason: 'No later season is set.',
  nextSeason: (day: string) => `The next opens on ${day}.`,
  otherWeapon: (day: string, seasons: string, weapon: string) =>
    `${day} is in ${seasons}, which does not take the ${weapon}.`,
  outOfSeason: (day: string, weapon: string | null) =>
    `${day} is out of season${weapon === null ? '' : ` for the ${weapon}`} by the club's dates.`,
  standWeapon: (stand: string, weapon: string, allowed: readonly string[]) =>
    `${stand} is not for the ${weapon}: weapons allowed there are ${allowed.length === 0 ? 'none' : allowed.join(', ')}.`,
  roleHoldsNone: (role: string) => `A ${role} does not hold sits in this club.`,
  notNamed: (stand: string, member: string) => `${stand} is kept for named members, and ${member} is not one of them.`,
  windowOver: (window: string, day: string, clock: string) => `The ${window} of ${day} ended at ${clock}.`,
  noWalkUp: (window: string, day: string, clock: string) =>
    `The ${window} of ${day} began at ${clock}, and the club has no walk-up sits.`,
  taken: (stand: string, day: string, windows: readonly string[], member: string) =>
    `${stand} is taken ${on(day, windows)}: ${member} has it.`,
  memberBusy: (member: string, stand: string, day: string, windows: readonly string[]) =>
    `${member} already has ${stand} ${on(day, windows)}. One stand a member in each window.`,
  resting: (x: { stand: string; member: string; day: string; restDays: number; through: string }) =>
    `${x.stand} is resting: ${x.member} sat there on ${x.day}. The rule is ${rest(x.restDays)}, so it rests through ${x.through}.`,
  breaksRest: (x: { stand: string; member: string; day: string; restDays: number; asked: string }) =>
    `${x.stand} is booked by ${x.member} on ${x.day}. The rule is ${rest(x.restDays)}, and a sit on ${x.asked} would break it.`,
  spacing: (x: { stand: string; apart: string; other: string; member: string; least: string }) =>
    `${x.stand} is ${x.apart} from ${x.other}, where ${x.member} sits. The least distance between occupied stands is ${x.least}.`,
  passThrough: (stand: string, least: string, holders: string) =>
    `Every way in to ${stand} passes within ${least} of an occupied stand: ${holders}. The club allows no walking through that close.`,
  daysAhead: (days: number, day: string, opens: string) =>
    `Claims are taken ${counted(days, 'day')} ahead: ${day} opens on ${opens}.`,
  huntTime: (x: { hours: number; window: string; day: string; opensDay: string; opensAt: string }) =>
    `Claims are taken only at the time of the hunt, ${counted(x.hours, 'hour')} ahead: the ${x.window} of ${x.day} opens on ${x.opensDay} at ${x.opensAt}.`,
  clubClaims: (most: number) => `The club allows ${counted(most, 'claim')} at a time.`,
  memberClaims: (most: number, member: string, held: string) =>
    `A member may hold ${counted(most, 'claim')} at a time, and ${member} holds ${held}.`,
  standSeason: (stand: string, sits: number, most: number) =>
    `${stand} has had its ${sits} sits this season; the most is ${most}.`,
  memberSeason: (member: string, sits: number, most: number) =>
    `${member} has ${sits} sits this season; the most for a member is ${most}.`,
  guestsAtOnce: (most: number, named: number) =>
    `The club allows ${most === 0 ? 'no guests' : `at most ${most} at once`}; ${named} were named.`,
  guestDays: (member: string, used: number, most: number, more: number) =>
    `${member} has used ${used} of ${most} guest days this season; this needs ${more} more.`,
} as const;
