/** Of one row: a thing that cannot be taken. */
export const THING_PROBLEMS = {
  noPlace: 'It has no place on the ground.',
  noPlaces: 'It has no places.',
  noNumbers: (place: number) => `Place ${place} of it is no pair of numbers.`,
  noDegrees: (place: number, lon: number, lat: number) =>
    `Place ${place} of it, ${lon}, ${lat}, is not in degrees: export the file as WGS 84.`,
  shortLine: 'It is a line of one place.',
  shortArea: 'It is an area of too few corners.',
  tooLong: (points: number, most: number) => `It has ${points} points and cannot be thinned to ${most}: split it.`,
  noFeature: (feature: number) => `Feature ${feature} is no GeoJSON feature.`,
  noShape: (feature: number) => `Feature ${feature} has no shape that can be read.`,
  /** `line`: null when the parser does not know it. */
  badPoint: (line: number | null, lat: string | null, lon: string | null) =>
    onLine(line, `latitude "${lat ?? 'nothing'}", longitude "${lon ?? 'nothing'}" is no place.`),
  badTuple: (line: number | null, tuple: string) => onLine(line, `"${tuple}" is no longitude, latitude.`),
  noLatitude: (line: number, value: string) =>
    value === '' ? `Line ${line}: it has no latitude.` : `Line ${line}: "${value}" is no latitude.`,
  noLongitude: (line: number, value: string) =>
    value === '' ? `Line ${line}: it has no longitude.` : `Line ${line}: "${value}" is no longitude.`,
} as const;

function onLine(line: number | null, problem: string): string {
  return line === null ? problem : `Line ${line}: ${problem}`;
}

export const THING_REMARKS = {
  thinned: (before: number, after: number, metres: number) =>
    `Thinned from ${before} points to ${after}, none more than ${metres} m off.`,
  shortName: 'The name was shortened.',
  shortNotes: 'The notes were shortened.',
} as const;

/** Of a whole file that cannot be read. */
export const FILE_PROBLEMS = {
  empty: 'The file is empty: choose another.',
  blank: 'The file holds nothing but blanks: choose another.',
  noMap: 'This is no file of a map that can be read here: choose GPX, KML, KMZ, GeoJSON or CSV.',
  otherXml: 'This is XML, but neither GPX nor KML: export it again in one of those.',
  tooMuch: 'The file is more than can be read at once: split it, or thin its tracks, and try again.',
  nothing: 'There is nothing in the file that could be put on a map.',
  bytes: (megabytes: number) => `The file is over ${megabytes} MB: split it, or leave out what is not needed.`,
  points: (most: number) => `The file holds more than ${most} points: split it.`,
  things: (most: number) => `The file holds more than ${most} things: split it.`,
  encoding: (name: string) => `Line 1 says the text is "${name}", which is not known. Save it as UTF-8.`,
  badBytes: (encoding: string) => `The file holds bytes that are no ${encoding} text. Save it as UTF-8 and try again.`,
  badBytesOn: (line: number, encoding: string) =>
    `Line ${line} holds bytes that are no ${encoding} text. Save it as UTF-8 and try again.`,
  gpxRoot: 'Line 1: the outermost element is not gpx.',
  kmlRoot: 'Line 1: the outermost element is not kml.',
  declared: (line: number) =>
    `Line ${line} declares a document type or entities, which no map file needs. It was not read.`,
  elements: 'The file holds more points than are read at once: split it, or thin its tracks, and try again.',
  brokenXml: 'The XML is broken there, or cut short. Export it again.',
  brokenXmlOn: (line: number) => `Line ${line}: the XML is broken there, or cut short. Export it again.`,
  strayNumber: (line: number, found: string) => `Line ${line} holds ${found}, which is no number a place can have.`,
  noJson: 'The file is no JSON: it may be cut short. Export it again.',
  noJsonFrom: (line: number) => `From line ${line} on it is no JSON: it may be cut short. Export it again.`,
  otherSystem: (name: string) =>
    `The file measures places in "${name}": export it again in degrees (WGS 84, EPSG:4326).`,
  features: (features: number, most: number) =>
    `The file holds ${features} features; at most ${most} are read at once: split it.`,
  noGeoJson: 'This is JSON, but no GeoJSON: a FeatureCollection is looked for.',
  longLine: (line: number, length: number, most: number) =>
    `Line ${line} is ${length} characters long; a line of a table has at most ${most}.`,
  openQuote: (line: number) => `Line ${line}: a quotation mark is not closed.`,
  noHeadings: (line: number) =>
    `Line ${line} has no headings for latitude and longitude: name two columns lat and lon.`,
  rows: (most: number) => `The table has more than ${most} rows: split it.`,
  entries: (most: number) => `The archive holds more than ${most} files.`,
  damagedKml: 'The archive is damaged: its KML cannot be unpacked. Export it again.',
  damaged: 'The archive is damaged: export it again.',
  unpacked: 'The archive unpacks to far more than a map needs, so it was not opened any further.',
  noKml: 'The archive holds no KML: choose a KMZ file.',
  cutShort: 'The archive is cut short: export it again.',
} as const;

export const FILE_REMARKS = {
  heights: 'Heights in the file are left out: the map is flat.',
  western: 'The text is not UTF-8: it was read as Windows Western. Look whether the names are right.',
  links: 'Links to other places in it were not followed.',
} as const;
