import type { Spot } from './demo-place';

export interface DemoParking {
  key: string;
  name: string;
  at: Spot;
  notes: string;
}

export const PARKINGS = [
  {
    key: 'road',
    name: 'Road Gate',
    at: [-690, -585],
    notes: 'Combination on the chain. Nose out, lights off before the bend. Two trucks.',
  },
  {
    key: 'barn',
    name: 'Barn Lot',
    at: [720, -575],
    notes: 'Behind the barn, where headlights do not sweep the corn. Four trucks.',
  },
  {
    key: 'ridge',
    name: 'Ridge Gate',
    at: [-770, 520],
    notes: 'Old log landing. No good after heavy rain. Phone signal here, none in the bottom.',
  },
] as const satisfies readonly DemoParking[];

export type ParkingKey = (typeof PARKINGS)[number]['key'];
