import type { MapItemProps, MapLayer } from '@/core/map-layers';
import { BOUNDARY } from './boundary';
import type { DemoFeature } from './feature-types';

export interface DemoLand {
  layer: MapLayer;
  name: string;
  shape: DemoFeature['shape'];
  props?: MapItemProps;
  /** Years before this one in which the timber was cut. */
  cutYearsAgo?: number;
  notes?: string;
}

/** What grows and lies there, roads and trails, and what nobody should walk or shoot into. */
export const LAND: readonly DemoLand[] = [
  { layer: 'boundary', name: 'Tansy Fork ground', shape: { area: BOUNDARY } },
  {
    layer: 'wood',
    name: 'North Hill',
    shape: {
      area: [
        [-690, -60],
        [-500, -95],
        [-300, -130],
        [-60, -110],
        [60, -95],
        [60, 30],
        [210, 30],
        [330, -120],
        [560, -130],
        [655, -110],
        [655, 150],
        [708, 168],
        [645, 505],
        [230, 606],
        [-95, 606],
        [-428, 648],
        [-792, 541],
        [-700, 60],
      ],
    },
  },
  {
    layer: 'wood',
    name: '',
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
    cutYearsAgo: 8,
  },
  {
    layer: 'field',
    name: 'Barn pasture',
    shape: {
      area: [
        [575, -330],
        [760, -330],
        [764, -596],
        [575, -590],
      ],
    },
  },
  {
    layer: 'crop',
    name: '',
    shape: {
      area: [
        [100, -325],
        [370, -332],
        [570, -318],
        [565, -575],
        [330, -582],
        [102, -578],
      ],
    },
  },
  {
    layer: 'crop',
    name: '',
    shape: {
      area: [
        [-612, -338],
        [-410, -330],
        [-206, -340],
        [-210, -574],
        [-420, -580],
        [-607, -572],
      ],
    },
  },
  {
    layer: 'swamp',
    name: 'The alders',
    shape: {
      area: [
        [-670, -88],
        [-555, -100],
        [-510, -10],
        [-552, 62],
        [-662, 45],
      ],
    },
  },
  {
    layer: 'water',
    name: '',
    shape: {
      area: [
        [448, -275],
        [478, -262],
        [500, -283],
        [486, -306],
        [455, -300],
      ],
    },
  },
  {
    layer: 'road',
    name: 'Township road',
    shape: {
      line: [
        [-830, -622],
        [-400, -632],
        [100, -624],
        [500, -628],
        [840, -630],
      ],
    },
  },
  {
    layer: 'road',
    name: 'Barn lane',
    shape: {
      line: [
        [700, -628],
        [712, -600],
        [720, -575],
        [716, -480],
      ],
    },
  },
  {
    layer: 'trail',
    name: 'Ridge road',
    shape: {
      line: [
        [-860, 470],
        [-770, 520],
        [-640, 575],
        [-440, 622],
        [-200, 610],
        [-20, 608],
        [130, 605],
      ],
    },
  },
  {
    layer: 'trail',
    name: 'Creek trail',
    shape: {
      line: [
        [-690, -560],
        [-655, -310],
        [-420, -205],
        [-250, -175],
        [-40, -175],
        [110, -172],
      ],
    },
  },
  {
    layer: 'closed_area',
    name: 'Barn and yard',
    shape: {
      area: [
        [650, -545],
        [758, -545],
        [762, -598],
        [652, -594],
      ],
    },
    notes: 'Livestock. Nobody hunts here.',
  },
  {
    layer: 'no_shoot',
    name: 'Toward the barn',
    shape: { point: [560, -330] },
    props: { sector: { fromDeg: 110, toDeg: 185, reachM: 280 } },
  },
  { layer: 'camera', name: 'Saddle camera', shape: { point: [-110, 560] }, props: { facingDeg: 120 } },
  { layer: 'camera', name: 'Upper Ford camera', shape: { point: [-58, -148] }, props: { facingDeg: 10 } },
  { layer: 'hazard', name: 'Old well', shape: { point: [620, -430] }, notes: 'Planked over. Keep off.' },
  { layer: 'gate', name: 'Chain', shape: { point: [-716, -598] } },
  { layer: 'gate', name: 'Ridge chain', shape: { point: [-792, 505] } },
  { layer: 'signal', name: 'Two bars', shape: { point: [-700, 540] } },
];
