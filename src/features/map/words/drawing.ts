export const MEASURED_WORDS = {
  area: (size: string, round: string) => `${size}, ${round} round`,
  /** `compass` null: no magnetic model covers the day. */
  leg: (far: string, sector: string, bearing: string, compass: string | null) =>
    `${far} toward ${sector}, ${bearing} true${compass === null ? '' : `, ${compass} by compass`}`,
  west: (degrees: string) => `${degrees} west`,
  east: (degrees: string) => `${degrees} east`,
  squareYards: (count: number) => `${count} sq yd`,
  yards: (count: string) => `${count} yd`,
} as const;

export const DRAW_TOOL_WORDS = {
  notByHand: 'It cannot be reshaped by hand: type its places.',
} as const;

export const NEW_THING_WORDS = {
  stand: 'Stand',
  parking: 'Parking place',
  approach: 'Approach',
  waysIn: 'Ways in',
  whatDeerUse: 'What deer use',
  land: 'Land',
  approachNeedsStand: 'An approach leads to a stand: draw the stand first.',
  fromParking: (parking: string) => `From ${parking}`,
  parkingName: 'Parking',
  approachIsLine: 'An approach is a line.',
} as const;

export const SETTLE_WORDS = {
  beside: ' (drawn beside)',
} as const;

export const SPLIT_WORDS = {
  spot: 'Choose a spot between the ends of the line.',
  cutPoints: 'Draw the cut as a line of two points or more.',
  across: 'The cut must run across the area, from one side to another.',
} as const;
