import type { WindowFrame } from '../window-frame';
import type { ApproachSettings } from './approach-settings';
import type { Entry } from './entries';
import { type WalkChance, type WalkWind, walkChance } from './walk-chance';
import type { WalkGround } from './walk-ground';
import { type WalkPlumes, walkTable } from './walk-scent';

/** One way in at one time, and the least costly way out at the window's end. */
export interface TriedWay {
  way: WalkGround;
  entry: Entry;
  in: WalkChance;
  out: WalkChance;
  outName: string;
}

/** What a walk needs that all stands of a window share. */
export interface WalkContext {
  frame: WindowFrame;
  windAt: (at: number) => WalkWind | null;
  plumes: WalkPlumes;
  settings: ApproachSettings;
}

/** A walk is judged at its middle: it is shorter than deer take to move on. */
function walkAt(way: WalkGround, middle: number, context: WalkContext): WalkChance {
  const wind = context.windAt(middle);
  const { dark, shares } = context.frame.momentAt(middle);
  const table = wind ? walkTable(way, wind.stability, context.plumes) : null;
  return walkChance(way, table, { dark, shares, wind }, context.settings);
}

/**
 * Every way in at every time worth trying, each with the best way out. Empty when no way in is drawn. Out is by its own ways where
 * they are drawn, else back along the ways in.
 */
export function tryWays(
  waysIn: WalkGround[],
  waysOut: WalkGround[],
  entries: Entry[],
  endAt: number,
  context: WalkContext,
): TriedWay[] {
  let out: WalkChance | null = null;
  let outName = '';
  for (const way of waysOut.length > 0 ? waysOut : waysIn) {
    const tried = walkAt(way, endAt + way.seconds * 500, context);
    if (out === null || tried.chance < out.chance) {
      out = tried;
      outName = way.approach.name;
    }
  }
  const found: TriedWay[] = [];
  if (out === null) return found;
  for (const way of waysIn) {
    for (const entry of entries) {
      found.push({ way, entry, in: walkAt(way, entry.inBy - way.seconds * 500, context), out, outName });
    }
  }
  return found;
}
