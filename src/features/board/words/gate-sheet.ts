/** Texts of the sheet of paper that hangs at the gate. */

export const GATE_PAGE_WORDS = {
  title: 'Gate sheet',
  lead: 'One sheet to hang at the gate: it works where no phone does.',
  dayBefore: 'Day before',
  dayAfter: 'Day after',
  print: 'Print or save as PDF',
} as const;

export const GATE_SHEET_WORDS = {
  made: (club: string, made: string) => `${club}. ${made}`,
  noRescue:
    'This sheet and Windrest are no rescue service. When somebody is missing or hurt, call the emergency number.',
  who: 'Who is where',
  nobody: 'Nobody has booked this day. Walk-ups sign below.',
  closed: 'Closed',
  nothingClosed: 'Nothing is closed.',
  sun: "Sun and the club's light",
  noLight: 'The club has written down no rule of light. State law decides.',
  wind: 'Wind by hour',
  barb: ' The barb points to where the wind comes from; look at the trees all the same.',
  ground: 'The ground',
  stand: (number: number, name: string, state: 'free' | 'booked' | 'closed') =>
    `${number}. ${name}${{ free: '', booked: ' (booked)', closed: ' (closed)' }[state]}`,
  legend: 'Black: booked. Crossed: closed. P: parking. Thin broken lines: ways in. Not to be measured from.',
  sketch: 'Sketch of the ground, north up: numbered stands, parking places, ways in. The list names the numbers.',
  parkingSign: 'P',
  north: 'N',
} as const;

export const GATE_SITS_WORDS = {
  region: 'Who is where, as a table',
  caption: 'Booked sits, then blank lines for walk-ups',
  stand: 'Stand',
  who: 'Who',
  window: 'Window',
  way: 'Parking, way in',
  backBy: 'Back by',
  in: 'In',
  out: 'Out',
  numbered: (number: number, name: string) => `${number}. ${name}`,
  withGuests: (who: string, guests: string) => (guests ? `${who}, with ${guests}` : who),
  blank: (number: number) => `Blank line for a walk-up ${number}`,
} as const;

export const GATE_WIND_WORDS = {
  region: 'Wind by hour, as a table',
  caption: 'Wind by hour at the club',
  hour: 'Hour',
  barb: 'Barb',
  wind: 'Wind',
  gusts: 'Gusts',
  air: 'Air',
  rain: 'Rain',
  calm: 'calm',
  variable: 'variable',
  windOf: (from: string, speed: string) => `${from} ${speed}`,
} as const;

/** What is told of a day's sun, light, closures and forecast. */
export const GATE_DAY_WORDS = {
  neverSets: 'The sun does not set.',
  neverRises: 'The sun does not rise.',
  sun: (sun: { rise: string; set: string; dawn: string; dusk: string }) =>
    `Up ${sun.rise}, down ${sun.set}. First light ${sun.dawn}, last light ${sun.dusk} (civil twilight).`,
  light: (name: string, span: string, rule: string) => `${name}: ${span}. ${rule}`,
  fetched: (age: string) => `Forecast fetched ${age}.`,
  noForecast: 'No forecast reaches this day.',
  made: (clock: string) => `Made ${clock}. Whatever is booked later is not on it.`,
  wholeGround: 'The whole ground',
  someStand: 'A stand',
  closed: (what: string, reason: string, to: string | null) =>
    `${what}: ${reason} (${to === null ? 'until opened again' : `to ${to}`})`,
} as const;
