export const SMALL_MAP_WORDS = {
  label: (stand: string | null) => `Map of the way to ${stand ?? 'the stand'}`,
  /** Between the length of a way and where it begins. */
  from: ', from ',
  loading: 'Unfolding the map',
  failed: 'The map could not be read',
  tryAgain: 'Try again',
  noWay: 'No way in is drawn.',
} as const;

export const MAP_SCREEN_WORDS = {
  save: (count: number) => `Save ${count === 1 ? 'one change' : `${count} changes`}`,
  draftTitle: 'Not saved yet',
  draftDrop: 'Start afresh',
  draftText: 'What you drew here before has been brought back.',
  showAll: 'All of it',
  measure: 'Measure',
  undo: 'Undo',
  redo: 'Redo',
  saving: 'Saving…',
  contours: 'Contours',
  photographs: 'Photographs from above',
  mapOf: (club: string) => `Map of ${club}`,
  besideTheMap: 'Beside the map',
  whatIsThere: 'What is there',
} as const;

export const MAP_DOING_WORDS = {
  add: {
    point: (kind: string) => `${kind}: tap where it is.`,
    line: (kind: string) => `${kind}: tap from point to point; tap the last one again to end.`,
    area: (kind: string) => `${kind}: tap its corners one after another; tap the first one again to close it.`,
  },
  addApproach: (kind: string) =>
    `${kind}: from the parking place to the stand, tap from point to point; tap the last one again to end.`,
  reshapePoint: (name: string | null) => `${name ?? 'Reshape'}: drag it.`,
  reshape: (name: string | null) =>
    `${name ?? 'Reshape'}: drag its corners, or the small dots between them, or the whole of it.`,
  split: 'Split: draw a line right across it.',
  splitLine: 'Split: tap the line where it is to part.',
  takeOut: 'Take out this corner',
  done: 'Done',
} as const;

export const SCALE_AND_NORTH_WORDS = {
  compass: (side: string) => `compass ${side}`,
  trueNorth: 'True north',
} as const;

export const MAP_CANVAS_WORDS = {
  label: (label: string) => `${label}. Arrow keys move it, plus and minus zoom. The list beside it says the same.`,
} as const;

export const LEGEND_WORDS = {
  stands: 'Stands and parking',
  ways: 'Approaches',
  features: 'What deer use',
  land: 'Cover, water, roads, trails',
  limits: 'Boundary, closed areas, no-shoot sectors',
  things: 'Cameras, hazards, gates, signal',
  title: 'Layers and signs',
  showMap: 'Show on the map',
  signStand: 'A black disc is a stand. The open brackets round it are its good winds: where the wind may come from.',
  signBrackets: 'The inner bracket is for the morning alone, the outer for the evening alone, the middle one for both.',
  signApproaches: 'Dotted black lines are approaches, whole where they are driven.',
  signFeatures: 'Long moss dashes are travel lines, moss dots rub lines, a heavy dashed ring a sanctuary.',
  signLand: 'Dots fill woods, ticks swamp, waves water, bare ground cut timber, hatching farm fields and plots.',
  signClosed: 'Crossed clay is closed. Clay hatching is where nobody shoots.',
} as const;

export const MAP_LIST_WORDS = {
  stands: 'Stands',
  approaches: 'Approaches',
  parkingPlaces: 'Parking places',
  whatDeerUse: 'What deer use',
  land: 'Land',
  empty: 'Nothing is drawn yet.',
  find: 'Find on the map',
  noneFound: 'Nothing on the map is called that.',
  notSavedYet: ' not saved yet',
  showAll: (count: number) => `Show all ${count}`,
} as const;

export const PLACES_WORDS = {
  place: 'Place',
  places: 'Places',
  placeHint: 'Latitude, longitude, such as 38.6051, -83.1952',
  placesHint: 'Latitude, longitude, one to a line',
} as const;

export const MAP_EDITOR_WORDS = {
  noMoreCorners: 'No more corners can go.',
} as const;
