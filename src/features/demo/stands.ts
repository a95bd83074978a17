import { BOTTOM_STANDS } from './bottom-stands';
import { HILL_STANDS } from './hill-stands';
import type { DemoStand } from './stand-types';

export const STANDS: readonly DemoStand[] = [...HILL_STANDS, ...BOTTOM_STANDS];
