import type { MapThing } from '../thing';

/** Marks in a box of 20 by 20 about its middle, as the insides of an SVG. Plain map signs, our own. */
const SIGNS = {
  raised: '<path class="m-sign" d="M-3 -6V6M3 -6V6M-3 -3H3M-3 0H3M-3 3H3"/>',
  box: '<path class="m-sign" d="M-5 4V-2L0 -6L5 -2V4Z"/>',
  ground: '<path class="m-sign" d="M-6 4C-6 -4 6 -4 6 4M-6 4H6"/>',
  parking:
    '<rect class="m-glyph" x="-8" y="-8" width="16" height="16"/><path class="m-glyph" fill="none" d="M-2 5V-5H1A3 3 0 0 1 1 1H-2"/>',
  scrape: '<ellipse class="m-glyph" rx="7" ry="4.5"/><path class="m-glyph" d="M-3 0H3"/>',
  crossing: '<path class="m-glyph" d="M-7 -4L0 0L-7 4M7 -4L0 0L7 4"/>',
  dot: '<circle class="m-glyph" r="5"/>',
  bedding: '<ellipse class="m-glyph" rx="8" ry="5" stroke-dasharray="1 3.2"/>',
  plant: '<path class="m-glyph" d="M0 7V-1M0 0C-6 0 -6 -6 -6 -6C0 -6 0 0 0 0M0 2C6 2 6 -4 6 -4C0 -4 0 2 0 2"/>',
  tree: '<circle class="m-glyph" cy="-2" r="5.5"/><path class="m-glyph" d="M0 3.5V8"/>',
  water: '<path class="m-glyph" d="M0 -8C4 -3 6 0 6 3A6 6 0 0 1 -6 3C-6 0 -4 -3 0 -8Z"/>',
  rub: '<path class="m-glyph" d="M-3 -7V7M3 -7V7M-3 -3L3 0M-3 2L3 5"/>',
  camera:
    '<rect class="m-glyph" x="-8" y="-5" width="16" height="11"/><circle class="m-glyph" cy="0.5" r="3"/><path class="m-glyph" d="M-4 -5V-8H0V-5"/>',
  hazard: '<path class="m-glyph" d="M0 -8L8 6H-8Z"/><path class="m-glyph" d="M0 -3V1M0 3.5V3.6"/>',
  gate: '<path class="m-glyph" d="M-8 -6V7M8 -6V7M-8 -3H8M-8 3H8M-8 3L8 -3"/>',
  signal:
    '<path class="m-glyph" fill="none" d="M0 7V-1M-4 -5A5 5 0 0 1 4 -5M-7 -8A9 9 0 0 1 7 -8"/><circle class="m-glyph" r="1.5"/>',
  noShoot: '<circle class="m-glyph" r="7"/><path class="m-glyph" d="M-5 -5L5 5"/>',
} as const;

const FEATURE_SIGNS = {
  bedding: SIGNS.bedding,
  food_plot: SIGNS.plant,
  crop: SIGNS.plant,
  mast: SIGNS.tree,
  water: SIGNS.water,
  scrape: SIGNS.scrape,
  rub_line: SIGNS.rub,
  travel_line: SIGNS.dot,
  crossing: SIGNS.crossing,
  sanctuary: SIGNS.bedding,
} as const;

const LAYER_SIGNS: Partial<Record<Extract<MapThing, { kind: 'item' }>['what'], string>> = {
  camera: SIGNS.camera,
  hazard: SIGNS.hazard,
  gate: SIGNS.gate,
  signal: SIGNS.signal,
  no_shoot: SIGNS.noShoot,
  water: SIGNS.water,
};

const STAND_SIGNS = {
  ladder: SIGNS.raised,
  hang_on: SIGNS.raised,
  climber: SIGNS.raised,
  tripod: SIGNS.raised,
  box_blind: SIGNS.box,
  ground_blind: SIGNS.ground,
  natural_cover: SIGNS.ground,
} as const;

/** The mark of a thing that is a point. */
export function signOf(thing: MapThing): string {
  switch (thing.kind) {
    case 'stand':
      return `<circle class="m-disc" r="11"/>${STAND_SIGNS[thing.what]}${thing.closed ? '<path class="m-glyph" d="M-13 -13L13 13"/>' : ''}`;
    case 'parking':
      return SIGNS.parking;
    case 'feature':
      return FEATURE_SIGNS[thing.what];
    case 'item':
      return LAYER_SIGNS[thing.what] ?? SIGNS.dot;
    default:
      return SIGNS.dot;
  }
}
