export const GROUND_PAGE_WORDS = {
  noParkingText: 'Approaches begin at a parking place: add one first.',
  noParkingTextAsk: 'Approaches begin at a parking place; a steward adds them.',
  title: 'Ground',
  addFeature: 'Add a feature',
  addParking: 'Add a parking place',
  lead: 'What deer use and where people leave their trucks: the ranking weighs both.',
  bringFile: 'Bring in a file',
  takeItOut: 'Take it out',
  features: 'Features',
  noFeatures: 'No features yet',
  noFeaturesText: 'Begin with bedding and food: scent and noise are weighed against them.',
  noFeaturesTextAsk: 'A steward adds bedding, food, water and travel lines.',
  parkingPlaces: 'Parking places',
  noParking: 'No parking places yet',
} as const;

export const CHANGE_APPROACH_PAGE_WORDS = {
  title: 'Edit an approach',
  heading: (approach: string) => `Edit ${approach}`,
  draw: 'Draw it on the map',
} as const;

export const NEW_APPROACH_PAGE_WORDS = {
  title: 'Add an approach',
  draw: 'Draw it on the map',
} as const;

export const CHANGE_STAND_PAGE_WORDS = {
  title: 'Edit a stand',
  heading: (stand: string) => `Edit ${stand}`,
  stands: 'Stands',
} as const;

export const STAND_PAGE_WORDS = {
  title: 'Stand',
  edit: 'Edit',
  close: 'Close',
  removeText: 'Its approaches and closures go with it. Past sits stay on record.',
  booked: (sits: string) => `It is booked: ${sits}. Cancel or move these sits first.`,
  closed: 'Closed',
  map: 'Map',
  draw: "Draw on the club's map",
  notes: 'Notes',
} as const;

export const NEW_STAND_PAGE_WORDS = {
  title: 'Add a stand',
  stands: 'Stands',
} as const;

export const STANDS_PAGE_WORDS = {
  title: 'Stands',
  add: 'Add a stand',
  lead: 'Every place to sit, the winds it is good for and whether it is open.',
  closedDays: 'Closed days',
  allClosed: 'The whole ground is closed',
  none: 'No stands yet',
  noneText: 'Add the first one: its place and its good winds are enough to begin ranking.',
  noneTextAsk: 'A steward adds the stands; ask for it.',
} as const;

export const FEATURE_PAGE_WORDS = {
  title: 'Feature',
  removeText: 'The ranking will no longer weigh it.',
  drawnAs: 'Drawn as',
  size: 'Size',
  months: 'Months',
  cropOf: (year: number) => `Crop of ${year}`,
  latitudeLongitude: 'Latitude, longitude',
  notes: 'Notes',
} as const;

export const NEW_FEATURE_PAGE_WORDS = {
  title: 'Add a feature',
  ground: 'Ground',
} as const;

export const PARKING_PAGE_WORDS = {
  title: 'Parking place',
  removeText: 'It can be removed once no approach begins there.',
  latitudeLongitude: 'Latitude, longitude',
  notes: 'Notes',
} as const;

export const NEW_PARKING_PAGE_WORDS = {
  title: 'Add a parking place',
  ground: 'Ground',
} as const;

export const CLOSURES_PAGE_WORDS = {
  title: 'Closed days',
  lead: 'Nobody can book on closed days. Sits booked before stay until the member or an admin cancels them.',
  closeDays: 'Close days',
  list: 'Closed now or later',
  none: 'Everything is open',
  noneText: 'What you close above is listed here, and can be opened again.',
  caption: 'Closures of today and later',
} as const;
