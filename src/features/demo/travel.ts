import type { DemoFeature } from './feature-types';

/** From the beds to the food in the evening, and back at first light. */
export const TRAVEL: readonly DemoFeature[] = [
  {
    name: 'Bench Trail',
    kind: 'travel_line',
    shape: {
      line: [
        [-190, 338],
        [-140, 250],
        [-60, 170],
        [-12, 110],
        [-8, 10],
        [-32, -80],
        [-40, -160],
        [-90, -260],
        [-218, -360],
      ],
    },
    notes: 'Laurel Bench, the white oaks, the Upper Ford, the hay.',
  },
  {
    name: 'Cedar Trail',
    kind: 'travel_line',
    shape: {
      line: [
        [445, 165],
        [372, 90],
        [300, 20],
        [256, -30],
        [236, -100],
        [232, -185],
        [215, -260],
        [190, -340],
      ],
    },
    notes: 'Cedar Thicket, the pool, the Lower Ford, the corn.',
  },
  {
    name: 'Pool to Plot',
    kind: 'travel_line',
    shape: {
      line: [
        [256, -30],
        [192, -38],
      ],
    },
  },
  {
    name: 'Saddle Trail',
    kind: 'travel_line',
    shape: {
      line: [
        [312, 492],
        [235, 540],
        [60, 555],
        [-90, 548],
        [-255, 500],
        [-390, 440],
        [-480, 375],
      ],
    },
    notes: 'Bucks cruise it at midday in November.',
  },
  {
    name: 'Clover Loop',
    kind: 'travel_line',
    shape: {
      line: [
        [-300, 330],
        [-275, 215],
        [-258, 100],
        [-360, 20],
        [-525, -12],
      ],
    },
  },
  {
    name: 'West Draw',
    kind: 'travel_line',
    shape: {
      line: [
        [-522, 335],
        [-548, 235],
        [-560, 140],
        [-575, 45],
      ],
    },
  },
  {
    name: 'Alder Edge',
    kind: 'travel_line',
    shape: {
      line: [
        [-565, -80],
        [-510, -110],
        [-480, -140],
        [-455, -240],
        [-440, -345],
      ],
    },
  },
  {
    name: 'Fence Line',
    kind: 'travel_line',
    shape: {
      line: [
        [560, 158],
        [585, 40],
        [600, -80],
        [600, -170],
        [598, -320],
      ],
    },
    use: { night: 0.1, dawn: 0.15, morning: 0.08, midday: 0.03, afternoon: 0.08, dusk: 0.2 },
    notes: 'Cedar Thicket to the apples, hugging the old fence. A side trail: little used but in acorn-poor years.',
  },
  { name: 'Upper Ford', kind: 'crossing', shape: { point: [-40, -160] } },
  { name: 'Lower Ford', kind: 'crossing', shape: { point: [232, -185] } },
  { name: 'West Ford', kind: 'crossing', shape: { point: [-480, -140] } },
  { name: 'Fence Gap', kind: 'crossing', shape: { point: [600, -170] } },
  { name: 'The Saddle', kind: 'crossing', shape: { point: [-90, 548] } },
];
