/** Where a forecast comes from, written beside it. */
export const WEATHER_LABELS = {
  hosted: 'Open-Meteo',
  made: 'Made weather (no real forecast)',
  pastHours: (label: string) => `${label}, past hours`,
  replay: (file: string) => `Replay of ${file}`,
} as const;

export const WEATHER_FAULTS = {
  /** `problem` is one of those below, or what a value is. */
  badAnswer: (problem: string) => `The weather service's answer cannot be used: ${problem}.`,
  badArchive: (problem: string) => `The weather archive's answer cannot be used: ${problem}.`,
  late: 'The weather service did not answer in time.',
  tooOften: 'The weather service was asked too often.',
  cutShort: "The weather service's answer is cut short.",
  noAnswer: 'The weather service cannot be reached or is out of order.',
  madeNotStarted: 'The made weather could not be started on this machine.',
} as const;

export const ANSWER_PROBLEMS = {
  otherPlace: 'is for another place',
  startsElsewhen: 'starts at no time near the one asked for',
  endsElsewhen: 'ends at no time asked for',
  noWind: 'has no wind in metres per second',
  mostlyNoWind: 'has no wind for most hours',
  noHours: 'holds no hours',
  noForecast: 'is not a forecast',
} as const;

/** A file of hours in place of a service. Columns go by their names in the file. */
export const REPLAY_FAULTS = {
  unreadable: (file: string) => `The file ${file} cannot be read.`,
  noHours: (file: string, first: { line: number; message: string } | undefined) =>
    `The file ${file} holds no hours.${first ? ` Line ${first.line}: ${first.message}` : ''}`,
  noColumns: (columns: readonly string[]) => `The heading has no column ${columns.join(', ')}.`,
  sameTime: (line: number) => `The same time stands on line ${line}; that one is kept.`,
  cells: (has: number, heading: number) => `Has ${has} cells; the heading has ${heading}.`,
  notInstant: (text: string) => `time_utc "${text}" is not an instant such as 2013-11-09T11:00:00Z.`,
  outOfRange: (column: string, cell: string, least: number, most: number) =>
    `${column} "${cell}" is not a number from ${least} to ${most}.`,
} as const;
