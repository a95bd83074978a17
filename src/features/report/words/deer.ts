export const DEER_WORDS = {
  note: 'Deer seen over hours sat, of sits with a log, those without a deer too. An index to compare stands and months by, not a census.',
  empty: 'No log is written yet. Deer an hour are worked out from the logs.',
  write: 'Write a log',
  unlogged: (sits: number) =>
    sits === 1
      ? '1 sit has no log and is not in these figures.'
      : `${sits} sits have no log and are not in these figures.`,
  unit: 'deer an hour',
  hours: (hours: number) => `${hours.toFixed(0)} h`,
  sits: 'Sits',
  hoursSat: 'Hours',
  deer: 'Deer',
  rate: 'Deer/h',
  interval: '95 % interval',
  more: 'Bucks, does and fawns are on the Sightings page',
  byStand: 'By stand',
  byStandChart: 'Deer an hour by stand.',
  byStandCaption: 'Deer an hour by stand, the most first',
  stand: 'Stand',
  byMonth: 'By month',
  byMonthChart: 'Deer an hour by month.',
  byMonthCaption: 'Deer an hour by month',
  month: 'Month',
} as const;
