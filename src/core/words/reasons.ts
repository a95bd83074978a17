const mostAt = (place: string | null) => (place === null ? '' : `, most of it at ${place}`);

/** Why a sit scores what it does. Chances and shares come written out; `most` is the place that takes most of it. */
export const REASON_WORDS = {
  arc: (share: string) => `Wind in a good arc for ${share} of the sit`,
  arcNoForecast: (share: string) => `No forecast: its good arcs take ${share} of the compass`,
  seatScent: (chance: string, most: string | null) => `Scent from the seat may reach deer: ${chance}${mostAt(most)}`,
  walkIn: (way: string, chance: string, most: string | null) => `Walking in by ${way}: ${chance}${mostAt(most)}`,
  walkOut: (way: string, chance: string, most: string | null) => `Walking out by ${way}: ${chance}${mostAt(most)}`,
  noWay: (chance: string) => `No way in is drawn: ${chance} assumed each way`,
  disturbed: (times: number) =>
    `Deer near here were disturbed lately (${times} ${times === 1 ? 'time' : 'times'}): they are alerted sooner`,
  learned: (quieter: boolean, points: number) =>
    `Sits here have gone ${quieter ? 'quieter' : 'louder'} than the sums say: ${points} points`,
  suitability: (rating: string) => `The steward rates it ${rating} for this window`,
  inRange: (features: string) => `In range: ${features}`,
  inRangeLittleUsed: (features: string) => `In range, little in use then: ${features}`,
  nothingInRange: 'Nothing deer use is in range',
  crosswind: 'How the wind lies to the travel line in range',
  sun: (span: string | null) => `Low sun in the eyes${span ? ` ${span}` : ''}`,
  span: (from: string, to: string) => `${from} to ${to}`,
  rain: 'Rain during the sit',
  wind: 'Strong wind at the seat',
  sightings: (here: string, club: string) => `Seen from it: ${here} deer an hour here, ${club} in the club`,
  pressure: (visits: number) => `Pressure near it in the last days (${visits} ${visits === 1 ? 'visit' : 'visits'})`,
  lateEntry: (inBy: string) => `In the seat from ${inBy} only`,
} as const;
