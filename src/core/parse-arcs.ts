import { FULL_CIRCLE } from './arcs';
import type { Arc } from './ground-types';
import { findSector, type Sector } from './sectors';
import { WIND_ERRORS } from './words/winds';

export type ParsedArcs = { ok: true; arcs: Arc[] } | { ok: false; message: string; at: number };

type End = { kind: 'point'; sector: Sector } | { kind: 'degrees'; deg: number };

const PART = /^([a-z]+|\d+(?:\.\d+)?)\s*°?(?:\s*(?:-|–|—|to\b)\s*([a-z]+|\d+(?:\.\d+)?)\s*°?)?$/i;

function readEnd(text: string): End | string {
  if (/^\d/.test(text)) {
    const deg = Number(text);
    return deg <= 360 ? { kind: 'degrees', deg } : WIND_ERRORS.overCircle(text);
  }
  const sector = findSector(text);
  return sector ? { kind: 'point', sector } : WIND_ERRORS.notPoint(text);
}

function readPart(part: string): Arc | string {
  if (/^(any|all)$/i.test(part)) return FULL_CIRCLE;
  const match = PART.exec(part);
  const [, first, second] = match ?? [];
  if (!first) return WIND_ERRORS.notWind(part);
  const from = readEnd(first);
  if (typeof from === 'string') return from;
  const to = second === undefined ? from : readEnd(second);
  if (typeof to === 'string') return to;
  if (from.kind === 'degrees' && to.kind === 'degrees') {
    if (from.deg === 0 && to.deg === 360) return FULL_CIRCLE;
    if (from.deg % 360 === to.deg % 360) return WIND_ERRORS.oneDirection(first);
  }
  const fromDeg = from.kind === 'point' ? from.sector.lowerDeg : from.deg % 360;
  const toDeg = to.kind === 'point' ? to.sector.upperDeg : to.deg % 360;
  // From one point clockwise to the point before it goes all the way round.
  return fromDeg === toDeg ? FULL_CIRCLE : { fromDeg, toDeg };
}

/**
 * Good-wind arcs from what a person types: 'NW-N', 'NW to N', '310-20', 'W', 'N, SW-W', 'any', in any mix. Spans run
 * clockwise and may cross north. A compass point holds its whole sector: 'NW-N' is 303.75 to 11.25. Degrees are taken as
 * they stand, 0-360. Blank text is no arcs. On failure `at` is where in the text the trouble starts.
 */
export function parseArcs(text: string): ParsedArcs {
  const arcs: Arc[] = [];
  let at = 0;
  for (const piece of text.split(/([,;\n&]|\band\b)/i)) {
    const part = piece.trim();
    if (part !== '' && !/^([,;&]|and)$/i.test(part)) {
      const arc = readPart(part);
      if (typeof arc === 'string') return { ok: false, message: arc, at: at + piece.indexOf(part) };
      arcs.push(arc);
    }
    at += piece.length;
  }
  return { ok: true, arcs };
}
