import type { DemoFeature } from './feature-types';

/** Where deer lie up: the benches and thickets north of the creek, in reach of food to the south. */
export const COVER: readonly DemoFeature[] = [
  {
    name: 'Laurel Bench',
    kind: 'bedding',
    shape: {
      area: [
        [-345, 335],
        [-240, 320],
        [-135, 345],
        [-125, 415],
        [-230, 440],
        [-335, 425],
      ],
    },
    notes: 'South-facing bench under the ridge. Does use it every day; look over it from the ridge, never from below.',
  },
  {
    name: 'Cedar Thicket',
    kind: 'bedding',
    shape: {
      area: [
        [425, 165],
        [510, 150],
        [600, 175],
        [605, 255],
        [520, 285],
        [435, 260],
      ],
    },
  },
  {
    name: 'Old Cutover',
    kind: 'bedding',
    shape: {
      area: [
        [300, 430],
        [420, 415],
        [540, 440],
        [530, 530],
        [400, 545],
        [310, 510],
      ],
    },
    notes: 'Cut eight years ago. Blackberry to the chest.',
  },
  {
    name: 'Alder Bottom',
    kind: 'bedding',
    shape: {
      area: [
        [-660, -75],
        [-560, -85],
        [-525, -10],
        [-560, 50],
        [-650, 35],
      ],
    },
  },
  {
    name: 'Grapevine Point',
    kind: 'bedding',
    shape: {
      area: [
        [-560, 335],
        [-490, 325],
        [-470, 385],
        [-530, 410],
      ],
    },
    notes: 'One good buck lies here with a north wind at his back and the draw below him.',
  },
  {
    name: 'The Hemlocks',
    kind: 'sanctuary',
    shape: {
      area: [
        [-30, 245],
        [110, 235],
        [255, 250],
        [270, 400],
        [230, 505],
        [90, 520],
        [-20, 470],
      ],
    },
    notes: 'Nobody goes in but to recover a deer, and then with an officer.',
  },
];

export const FOOD: readonly DemoFeature[] = [
  {
    name: 'Clover Patch',
    kind: 'food_plot',
    shape: {
      area: [
        [-290, 62],
        [-222, 58],
        [-218, 96],
        [-286, 102],
      ],
    },
    notes: 'A little over half an acre. Overseeded each spring.',
  },
  {
    name: 'Hourglass Plot',
    kind: 'food_plot',
    shape: {
      area: [
        [80, -62],
        [135, -48],
        [192, -60],
        [190, -16],
        [134, -28],
        [82, -14],
      ],
    },
    months: [8, 9, 10, 11, 12, 1, 2],
    notes: 'Turnips and rye. Narrow waist in bow range of the box.',
  },
  {
    name: 'Kiln Plot',
    kind: 'food_plot',
    shape: {
      area: [
        [-415, 545],
        [-362, 552],
        [-366, 588],
        [-412, 582],
      ],
    },
    months: [8, 9, 10, 11, 12, 1],
    notes: 'Winter wheat on the old charcoal flat.',
  },
  {
    name: 'South Corn',
    kind: 'crop',
    shape: {
      area: [
        [112, -338],
        [360, -345],
        [560, -330],
        [555, -560],
        [330, -570],
        [115, -565],
      ],
    },
    months: [7, 8, 9, 10, 11, 12],
    rotation: [
      { yearsAgo: -1, crop: 'Soybeans', months: [6, 7, 8, 9, 10, 11] },
      { yearsAgo: 0, crop: 'Corn', months: [7, 8, 9, 10, 11, 12, 1, 2] },
      { yearsAgo: 1, crop: 'Soybeans', months: [6, 7, 8, 9, 10, 11] },
    ],
    notes: 'Standing until the neighbour combines it; waste grain after.',
  },
  {
    name: 'Hay Bottom',
    kind: 'crop',
    shape: {
      area: [
        [-520, -350],
        [-410, -342],
        [-218, -352],
        [-222, -562],
        [-420, -568],
        [-515, -560],
      ],
    },
    notes: 'Alfalfa and orchard grass, last cut in September.',
  },
  {
    name: 'White Oak Flat',
    kind: 'mast',
    shape: {
      area: [
        [-60, 62],
        [55, 58],
        [62, 140],
        [-52, 150],
      ],
    },
    months: [9, 10, 11, 12],
  },
  {
    name: 'Ridge Oaks',
    kind: 'mast',
    shape: {
      area: [
        [-260, 505],
        [-130, 495],
        [-120, 545],
        [-250, 560],
      ],
    },
    months: [9, 10, 11, 12],
    notes: 'Chestnut oaks. Bear well every third year or so.',
  },
  {
    name: 'Old Orchard',
    kind: 'mast',
    shape: {
      area: [
        [555, -318],
        [625, -322],
        [630, -400],
        [570, -405],
      ],
    },
    months: [8, 9, 10, 11],
    notes: 'Nine apple trees still drop.',
  },
  {
    name: 'Persimmon Row',
    kind: 'mast',
    shape: {
      line: [
        [-345, -325],
        [-250, -322],
      ],
    },
    months: [9, 10, 11],
  },
];
