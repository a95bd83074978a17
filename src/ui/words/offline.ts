export const OFFLINE_WORDS = {
  kept: 'Kept copy',
  noSignal: 'No signal',
  asOf: ', as of ',
} as const;

export const KEPT_WORDS = {
  title: 'Kept on this device',
  text: 'It is sent as soon as there is a signal.',
} as const;

export const ZONE_WORDS = { byClub: (zone: string) => `Times are by the club's clock: ${zone}.` } as const;
