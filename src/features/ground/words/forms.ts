import { LOST } from '@/ui/words/lost';

export const HERE_WORDS = {
  here: 'I am standing there',
  noPosition: 'This device tells no position: type the numbers.',
  refused: 'The position could not be had: allow it, or type the numbers.',
  finding: 'Finding the place…',
} as const;

export const APPROACH_WORDS = {
  saved: (name: string) => `${name} is saved`,
  name: 'Name',
  parkingId: 'From parking place',
  none: 'None',
  direction: 'Walked',
  points: 'Places along the way',
  pointsHint: (stand: string) =>
    `One to a line, latitude, longitude, from the parking place to ${stand}. The two ends may be left out.`,
  drivenTo: 'Driven as far as line',
  drivenToHint: 'Number of the last line above that is driven. Left blank, all of it is walked.',
  notes: 'Notes',
  save: 'Save approach',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const DRAFT_NOTICE_WORDS = {
  title: 'Not saved yet',
  drop: 'Start afresh',
  text: 'What you typed here before has been brought back.',
} as const;

export const FEATURE_WORDS = {
  saved: (name: string) => `${name} is saved`,
  name: 'Name',
  kind: 'Kind',
  shape: 'Drawn as',
  places: 'Places',
  placesHint: 'One to a line, latitude, longitude; an area closes itself. Or paste GeoJSON.',
  months: 'Months in which deer use it',
  notes: 'Notes',
  save: 'Save feature',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const FEATURE_USE_WORDS = {
  night: 'Night',
  dawn: 'Dawn',
  morning: 'Morning',
  midday: 'Midday',
  afternoon: 'Afternoon',
  dusk: 'Dusk',
  chance: 'Chance that deer are here',
  chanceHint: (feature: string) => `In a hundred times. Left blank, as is common for ${feature}: the pale figures.`,
  crops: 'Crops by year',
  cropsHint:
    "In a year that is named here, its months stand in place of those above. A year's crop counts until March of the next.",
  year: 'Year',
  crop: 'Crop',
  months: 'Months in which deer use it then',
  removeYear: 'Take this year out',
  addYear: 'Add a year',
} as const;

export const GROUND_TABLE_WORDS = {
  feature: 'Feature',
  kind: 'Kind',
  drawnAs: 'Drawn as',
  size: 'Size',
  months: 'Months',
  parkingPlace: 'Parking place',
  latitudeLongitude: 'Latitude, longitude',
  approaches: 'Approaches',
  notes: 'Notes',
  featuresCaption: 'Features deer use',
  find: 'Find a feature by name, kind or month',
  parkingsCaption: 'Parking places',
} as const;

export const OPEN_AGAIN_WORDS = {
  title: (what: string) => `Open ${what} again?`,
  openAgain: 'Open again',
  keepClosed: 'Keep closed',
  lost: LOST,
  text: 'Members can book from today on. Closed days that are past stay on record.',
} as const;

export const PARKING_WORDS = {
  saved: (name: string) => `${name} is saved`,
  name: 'Name',
  lat: 'Latitude',
  latHint: 'Degrees, such as 38.6051',
  lon: 'Longitude',
  lonHint: 'West is minus, such as -83.1952',
  notes: 'Notes',
  notesHint: 'Gate, room, mud.',
  save: 'Save parking place',
  saving: 'Saving…',
  back: 'Back without saving',
} as const;

export const REMOVE_WORDS = {
  title: (name: string) => `Remove ${name}?`,
  removeLabel: (name: string) => `Remove ${name}`,
  remove: 'Remove',
  lost: LOST,
  removed: (name: string) => `${name} is removed`,
} as const;
