import type { Spot } from './demo-place';
import type { ParkingKey } from './parkings';

export interface DemoApproach {
  stand: string;
  from: ParkingKey;
  name: string;
  direction: 'in' | 'out' | 'both';
  /** From the parking place to the stand; the parking place and the stand themselves are added. */
  by: readonly Spot[];
  /** Points after the parking place that are driven. */
  driven?: number;
  notes?: string;
}

/** The east fence, low and out of sight of the corn. */
const EAST_FENCE: readonly Spot[] = [
  [752, -420],
  [735, -225],
];
const TO_FENCE_WOOD: readonly Spot[] = [...EAST_FENCE, [655, -135]];
const RIDGE_ROAD: readonly Spot[] = [
  [-640, 575],
  [-440, 622],
];
const SOUTH_FENCE: readonly Spot[] = [[-160, -594]];

export const APPROACHES: readonly DemoApproach[] = [
  {
    stand: 'pool',
    from: 'barn',
    name: 'East fence and creek',
    direction: 'both',
    by: [...TO_FENCE_WOOD, [520, -178], [390, -160]],
    notes: 'Wade the last hundred yards: no scent on the bank, no noise over the riffle.',
  },
  {
    stand: 'pool',
    from: 'barn',
    name: 'Straight up the corn',
    direction: 'both',
    by: [
      [580, -310],
      [400, -280],
      [320, -190],
    ],
    notes: 'Short, and it empties the corn in the dark. Only after a combine has been through.',
  },
  {
    stand: 'hourglass',
    from: 'barn',
    name: 'Creek bed from the barn',
    direction: 'both',
    by: [...TO_FENCE_WOOD, [480, -200], [330, -205], [200, -165]],
  },
  {
    stand: 'hourglass',
    from: 'road',
    name: 'South fence and hedge',
    direction: 'in',
    by: [...SOUTH_FENCE, [40, -585], [62, -330], [70, -190]],
    notes: 'For the early afternoon. Passes the corn corner.',
  },
  {
    stand: 'clover',
    from: 'road',
    name: 'West creek path',
    direction: 'both',
    by: [
      [-668, -310],
      [-420, -205],
      [-270, -170],
    ],
  },
  {
    stand: 'clover',
    from: 'ridge',
    name: 'Down off the ridge',
    direction: 'in',
    by: [
      [-480, 470],
      [-360, 300],
      [-250, 160],
    ],
    notes: 'Through the edge of the Laurel Bench: shown so that nobody takes it for a short cut.',
  },
  {
    stand: 'bench',
    from: 'road',
    name: 'Ditch from the creek',
    direction: 'both',
    by: [
      [-668, -310],
      [-420, -205],
      [-250, -175],
      [-150, -20],
    ],
    notes: 'Headlamp off above the creek. Forty minutes.',
  },
  {
    stand: 'bench',
    from: 'ridge',
    name: 'Over the oaks',
    direction: 'in',
    by: [...RIDGE_ROAD, [-280, 595], [-110, 480], [-90, 320]],
    notes: 'Between two beds. Bad on any wind.',
  },
  { stand: 'saddle', from: 'ridge', name: 'Ridge road', direction: 'both', by: [...RIDGE_ROAD, [-200, 610]] },
  {
    stand: 'kiln',
    from: 'ridge',
    name: 'Ridge road to the kiln',
    direction: 'both',
    by: RIDGE_ROAD,
    notes: 'Easy walking, good for a youth.',
  },
  {
    stand: 'cutover',
    from: 'ridge',
    name: 'Ridge road to the end',
    direction: 'both',
    by: [...RIDGE_ROAD, [-200, 610], [-20, 608], [130, 605]],
    notes: 'Goes by the saddle: not when somebody sits there.',
  },
  {
    stand: 'cutover',
    from: 'barn',
    name: 'East line',
    direction: 'both',
    by: [...TO_FENCE_WOOD, [650, 60], [690, 190], [655, 380], [600, 515], [440, 558]],
    notes: 'Fifty minutes.',
  },
  {
    stand: 'cedar',
    from: 'barn',
    name: 'East line to the cedars',
    direction: 'both',
    by: [...TO_FENCE_WOOD, [645, 20]],
  },
  {
    stand: 'draw',
    from: 'ridge',
    name: 'West line',
    direction: 'both',
    by: [
      [-770, 430],
      [-705, 230],
    ],
  },
  {
    stand: 'alder',
    from: 'road',
    name: 'West fence and ford',
    direction: 'both',
    by: [
      [-668, -310],
      [-440, -210],
    ],
    notes: 'Cross below the West Ford, not at it.',
  },
  {
    stand: 'upper-ford',
    from: 'road',
    name: 'Middle hedge',
    direction: 'both',
    by: [...SOUTH_FENCE, [0, -580], [22, -400]],
  },
  {
    stand: 'lower-ford',
    from: 'barn',
    name: 'Pond ditch',
    direction: 'in',
    by: [
      [610, -300],
      [450, -245],
    ],
    notes: 'By the top of the corn. Early afternoon only.',
  },
  {
    stand: 'lower-ford',
    from: 'barn',
    name: 'Creek bed',
    direction: 'both',
    by: [...TO_FENCE_WOOD, [480, -205], [350, -210]],
  },
  {
    stand: 'hay',
    from: 'road',
    name: 'South fence, then the hedge',
    direction: 'both',
    by: [...SOUTH_FENCE, [-140, -450]],
  },
  {
    stand: 'corn',
    from: 'road',
    name: 'South fence by truck',
    direction: 'in',
    by: [...SOUTH_FENCE, [45, -585], [62, -440]],
    driven: 2,
    notes: 'Be dropped at the hedge: deer take a truck for the farmer.',
  },
  {
    stand: 'corn',
    from: 'barn',
    name: 'Below the corn',
    direction: 'both',
    by: [
      [330, -590],
      [75, -585],
      [62, -440],
    ],
  },
  { stand: 'gap', from: 'barn', name: 'East fence', direction: 'both', by: EAST_FENCE },
  { stand: 'orchard', from: 'barn', name: 'Around by the fence', direction: 'both', by: [[745, -470]] },
  {
    stand: 'orchard',
    from: 'barn',
    name: 'Farm lane by truck',
    direction: 'in',
    by: [
      [610, -575],
      [640, -450],
    ],
    driven: 1,
  },
];
