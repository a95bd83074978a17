import { listText } from './parts';

/** What draws deer where a seat has no shot at them. `side` is how it lies to the seat. */
export const OFF_SHOT_WORDS = {
  side: { behind: 'behind the seat', off: 'off the shot side', fine: 'out of range' },
  text: (feature: string, side: string, stand: string, away: string) =>
    `${feature} lies ${side} of ${stand}, ${away} of it`,
  why: (within: string, sector: string, otherStands: readonly string[]) =>
    `What draws deer within ${within} of a seat and gives no shot pulls them ${sector} of it, where they look back at it and wind it.${otherStands.length > 0 ? ` It is in shot from ${listText(otherStands)}.` : ''}`,
  block: (feature: string, stand: string) => `Block the way from ${feature} past ${stand}`,
  trim: (stand: string, feature: string) => `Trim a lane from ${stand} to ${feature}`,
  moveSeat: (stand: string, feature: string) => `Move or turn ${stand} so that ${feature} is in shot`,
} as const;

export const UNHUNTABLE_WORDS = {
  noWind: (feature: string, stands: readonly string[]) =>
    `${feature} can be hunted on no wind: ${stands.join(', ')} ${stands.length === 1 ? 'reaches' : 'reach'} it only with scent blowing to it`,
  noStand: (feature: string, nearest: string, away: string) =>
    `${feature} is in shot from no stand; the nearest, ${nearest}, has it ${away}`,
  whyNoWind: 'Every good wind of the stands that reach it carries scent from the seat to where the deer come.',
  whyNoStand: 'What draws deer where nobody can sit draws them away from where somebody does.',
  hangSeat: (feature: string) => `Hang a seat off ${feature}, crosswind of it`,
} as const;

export const OFF_LINES_WORDS = {
  text: (feature: string, line: string, distance: string) =>
    `${feature} is off every line of movement: the nearest, ${line}, is ${distance} away`,
  why: 'Deer leave the line they should travel to reach it, by a way nobody has drawn or sits on.',
  move: (feature: string, line: string) => `Move ${feature} to ${line}`,
  drawLine: (feature: string) => `Draw the line deer take to ${feature}`,
} as const;

export const SCRAPE_WORDS = {
  text: (count: number, scrape: string, seat: { stand: string; away: string } | null) =>
    `${count} scrapes in one opening: keep ${scrape}${seat ? `, ${seat.away} of ${seat.stand}` : ''}`,
  /** `reasons` are those below. */
  why: (scrape: string, reasons: readonly string[]) =>
    `One scrape an opening is worth more than many: deer then stop at the one with a shot. ${scrape} is ${reasons.join(', ') || 'as good as the others'}.`,
  onLine: 'on a travel line',
  bowShot: (distance: string, stand: string) => `${distance} from ${stand}`,
  onShotSide: 'on the shot side',
  offWalk: 'off the walk',
  nearSeat: 'so near a seat that noise carries',
  keepOne: (scrape: string, others: readonly string[]) => `Keep ${scrape} and take away ${listText(others)}`,
} as const;
