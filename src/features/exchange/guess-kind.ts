import type { DrawnShape } from '@/core/map-layers';
import { fitsShape, kindOf } from './kind-values';

/** Words by which hunters and their devices name things, the plainest first. Common practice. */
const WORDS: [RegExp, string[]][] = [
  [/\b(no[ -]?shoot|safety zone)/, ['item:no_shoot', 'item:closed_area']],
  [/\b(closed|keep out|off limits)\b/, ['item:closed_area']],
  [/\b(boundary|property line|border|perimeter)\b/, ['item:boundary']],
  [/\b(parking|park here|trailhead|lot)\b/, ['parking']],
  [/\b(trail|game|cell)?[ -]?cam(era)?s?\b/, ['item:camera']],
  [/\b(climber|climbing)\b/, ['stand:climber']],
  [/\b(hang[ -]?on|lock[ -]?on)\b/, ['stand:hang_on']],
  [/\b(tripod|quadpod)\b/, ['stand:tripod']],
  [/\b(box|tower|shooting house|elevated blind|shoot house)\b/, ['stand:box_blind']],
  [/\b(ground blind|pop[ -]?up|blind)\b/, ['stand:ground_blind']],
  [/\b(ladder|two[ -]?man|tree ?stand|stand)\b/, ['stand:ladder']],
  [/\b(food ?plot|plot|clover|brassica)\b/, ['feature:food_plot']],
  [/\b(sanctuary|refuge)\b/, ['feature:sanctuary']],
  [/\b(bedding|beds?)\b/, ['feature:bedding']],
  [/\bscrapes?\b/, ['feature:scrape']],
  [/\brubs?( line)?\b/, ['feature:rub_line']],
  [/\b(crossing|creek cross)\b/, ['feature:crossing']],
  [/\b(acorns?|mast|white ?oaks?|red ?oaks?|persimmon|apples?)\b/, ['feature:mast']],
  [/\b(corn|soy ?beans?|beans|wheat|alfalfa|milo|crop)\b/, ['feature:crop', 'item:crop']],
  [/\b(deer trail|travel|funnel|pinch|corridor)\b/, ['feature:travel_line']],
  [/\b(creek|pond|spring|water|river|lake|stream|seep)\b/, ['feature:water', 'item:water']],
  [/\b(swamp|marsh|bog)\b/, ['item:swamp']],
  [/\b(woods?|timber|clear ?cut|pines?|hardwoods?|forest)\b/, ['item:wood']],
  [/\b(field|pasture|meadow)\b/, ['item:field']],
  [/\b(approach|access|entry|walk[ -]?in|way in|path in)\b/, ['approach']],
  [/\b(road|drive|lane|two[ -]?track)\b/, ['item:road']],
  [/\b(trail|path|track|atv)\b/, ['item:trail']],
  [/\bgate\b/, ['item:gate']],
  [/\b(hazard|well|hole|danger)\b/, ['item:hazard']],
  [/\b(signal|cell service|phone)\b/, ['item:signal']],
];

/** A name for the eye: 'trailCam_2' reads as 'trail cam 2'. */
function toWords(text: string): string {
  return text
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .replace(/[_/.]+/g, ' ')
    .toLowerCase();
}

/** What a thing most likely is: by a kind of our own, then its type and symbol, its name, its notes. Empty: nothing tells. */
export function guessKind(thing: { name: string; told: string; notes: string }, shape: DrawnShape): string {
  const own = thing.told.split(' ').find((word) => kindOf(word) !== null);
  if (own && fitsShape(own, shape)) return own;
  for (const text of [thing.told, thing.name, thing.notes]) {
    const words = toWords(text);
    for (const [pattern, values] of WORDS) {
      if (!pattern.test(words)) continue;
      const fitting = values.find((value) => fitsShape(value, shape));
      if (fitting) return fitting;
    }
  }
  return '';
}
