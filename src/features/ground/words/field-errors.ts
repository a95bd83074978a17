export const GEOMETRY_ERRORS = {
  fewest: {
    point: (_fewest: number) => 'A point needs 1 place, one to a line.',
    line: (fewest: number) => `A line needs ${fewest} places or more, one to a line.`,
    area: (fewest: number) => `An area needs ${fewest} places or more, one to a line.`,
  },
  otherShape: {
    point: 'The GeoJSON is a point: choose that above.',
    line: 'The GeoJSON is a line: choose that above.',
    area: 'The GeoJSON is an area: choose that above.',
  },
  line: (line: number) => `Line ${line}: type latitude, longitude, such as 38.6051, -83.1952.`,
  lineFar: (line: number, why: string) => `Line ${line}: ${why}`,
  mostPoints: (most: number) => `At most ${most} points are kept: leave some out.`,
  brokenGeoJson: 'This begins like GeoJSON but cannot be read: paste the whole of it.',
  oneGeoJson: 'Paste one GeoJSON Point, LineString or Polygon.',
  outOfBounds: 'GeoJSON puts longitude first: these numbers are out of bounds.',
  openRing: 'A ring of the area is not closed.',
  onePlace: 'A point is one place only.',
  flatArea: 'These places lie on one line and hold no area.',
} as const;

export const TYPED_FIELD_ERRORS = {
  chooseADay: 'Choose a day.',
  mostWinds: (most: number) => `Type at most ${most} winds.`,
  bearing: 'Type a compass point (N, NNE ... NNW) or degrees from 0 to 360.',
  farSwapped: 'This is far from the club: did you swap latitude and longitude?',
  farMinus: 'This is far from the club: is a minus sign missing or too many? West is minus.',
  far: 'This is more than 100 km from the club: did you swap latitude and longitude?',
  latitude: 'Type the latitude in degrees, from -90 to 90, such as 38.6051.',
  longitude: 'Type the longitude in degrees, from -180 to 180; west is minus.',
} as const;

export const APPROACH_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  shapeLong: 'That is too long to keep: leave some points out.',
  notesLong: (most: number) => `Keep the notes to ${most} characters.`,
  parkingGone: 'That parking place is gone: choose another.',
  points: 'Type the places along the way, or choose a parking place to walk straight from.',
  beginsAtStand: (stand: string) => `The line begins near ${stand}: type it from the parking place to the stand.`,
  drivenTo: 'Driven as far as line',
} as const;

export const CLOSURE_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  lastDay: 'Choose the last closed day of the ground.',
  daysOrder: 'The last day comes before the first.',
  mostDays: (most: number) => `Close at most ${most} days at a time.`,
  reason: 'Say why: members read it.',
} as const;

export const FEATURE_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  shapeLong: 'That is too long to keep: leave some points out.',
  mostYears: (most: number) => `Keep at most ${most} years.`,
  notesLong: (most: number) => `Keep the notes to ${most} characters.`,
  months: 'Choose at least one month in which deer use it.',
  monthRange: 'Months run from 1 to 12.',
  use: 'Use',
  percent: 'percent',
  year: 'Year',
  cropTwice: (year: number) => `There is already a crop of ${year}.`,
} as const;

export const PARKING_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  notesLong: (most: number) => `Keep the notes to ${most} characters.`,
} as const;

export const STAND_FIELD_ERRORS = {
  long: (most: number) => `Keep it to ${most} characters.`,
  notesLong: (most: number) => `Keep the notes to ${most} characters.`,
  longestShot: 'Longest shot',
  oneWeapon: 'At least one weapon needs its longest shot.',
  seatHeight: 'Seat height',
  restDays: 'Rest days',
  mostSits: 'Most sits',
  seats: 'Seats',
  slope: 'Slope',
  percent: 'percent',
  oneMember: 'Name at least one member.',
} as const;
