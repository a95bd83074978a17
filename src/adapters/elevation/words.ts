export const ELEVATION_LABELS = {
  made: 'made-up hills (no elevation service is set up)',
  hosted: 'Open-Meteo, Copernicus heights 90 m apart',
} as const;

export const ELEVATION_FAULTS = {
  tooMany: 'Too many places were asked for at once.',
  tooOften: 'The elevation service was asked too often.',
  outOfOrder: 'The elevation service is out of order.',
  badAnswer: "The elevation service's answer cannot be used.",
  noAnswer: 'The elevation service cannot be reached or did not answer in time.',
  madeNotStarted: 'The made hills could not be started on this machine.',
} as const;
