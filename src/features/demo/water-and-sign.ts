import type { DemoFeature } from './feature-types';

const SCRAPE_MONTHS = [9, 10, 11, 12];

export const WATER: readonly DemoFeature[] = [
  {
    name: 'Tansy Fork',
    kind: 'water',
    shape: {
      line: [
        [-690, -105],
        [-480, -140],
        [-280, -180],
        [-40, -160],
        [110, -150],
        [232, -185],
        [420, -190],
        [600, -170],
        [665, -150],
      ],
    },
    use: { night: 0.03, dawn: 0.04, morning: 0.04, midday: 0.04, afternoon: 0.04, dusk: 0.04 },
    notes:
      'Knee-deep at most. Deer drink anywhere along it, so seldom at any one place; its noise covers a walk up the bed.',
  },
  {
    name: 'Timber Pool',
    kind: 'water',
    shape: { point: [256, -30] },
    notes: "Dug into the timber off the plot's east end: the last drink before dark, the first after light.",
  },
  { name: 'Bench Seep', kind: 'water', shape: { point: [-165, 262] } },
  {
    name: 'Barn Pond',
    kind: 'water',
    shape: {
      area: [
        [458, -292],
        [474, -298],
        [484, -284],
        [470, -274],
      ],
    },
  },
];

/** One scrape for each opening; rubs along the lines bucks keep to. */
export const SIGN: readonly DemoFeature[] = [
  { name: 'Clover Scrape', kind: 'scrape', shape: { point: [-219, 82] }, months: SCRAPE_MONTHS },
  { name: 'Hourglass Scrape', kind: 'scrape', shape: { point: [136, -25] }, months: SCRAPE_MONTHS },
  { name: 'Flat Scrape', kind: 'scrape', shape: { point: [-22, 152] }, months: SCRAPE_MONTHS },
  { name: 'Corn Corner Scrape', kind: 'scrape', shape: { point: [113, -336] }, months: SCRAPE_MONTHS },
  { name: 'Kiln Scrape', kind: 'scrape', shape: { point: [-388, 548] }, months: SCRAPE_MONTHS },
  {
    name: 'Bench Rubs',
    kind: 'rub_line',
    shape: {
      line: [
        [-138, 330],
        [-112, 262],
        [-70, 190],
      ],
    },
    months: [9, 10, 11, 12],
  },
  {
    name: 'Cedar Rubs',
    kind: 'rub_line',
    shape: {
      line: [
        [402, 122],
        [350, 62],
        [300, 10],
      ],
    },
    months: [9, 10, 11, 12],
  },
];
