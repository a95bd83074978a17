export const BUMPS_WORDS = {
  note: 'Of sits with a log: whether a deer was bumped on the way in, from the seat or on the way out. A sit without is a clean one. Deer bumped unseen are in no log. The wind is that of the forecast as the window began, at the stand.',
  empty: 'No log is written yet. Bumps are counted from the logs.',
  chart: 'Share of logged sits with a bump, by stand.',
  unit: 'percent of sits with a bump',
  sits: (sits: number) => (sits === 1 ? '1 sit' : `${sits} sits`),
  byStand: 'By stand, the largest share first',
  byWind: 'By wind, the whole club',
  byArc: 'By the stand’s good winds',
  stand: 'Stand',
  wind: 'Wind from',
  arc: 'Wind',
  inArc: 'In a good arc of the stand',
  outOfArc: 'Outside its good arcs',
  logged: 'Logged sits',
  bumped: 'With a bump',
  clean: 'Clean',
  share: 'Share',
  interval: '95 % interval',
  winds: 'Bumped by wind',
  windLine: (wind: string, bumped: number, sits: number) => `${wind} ${bumped} of ${sits}`,
  noWind: (sits: number) =>
    sits === 1
      ? '1 logged sit has no wind on record: it was calm, or begun before a forecast was kept.'
      : `${sits} logged sits have no wind on record: it was calm, or they began before a forecast was kept.`,
  few: 'A share of few sits says little: look at its interval.',
} as const;
