import { findApproachFaults } from './find-approach-faults';
import { findBesideApproach } from './find-beside-approach';
import { findCrowdedScrapes } from './find-crowded-scrapes';
import { findOffLines } from './find-off-lines';
import { findOffShot } from './find-off-shot';
import { findCameraSun, findSeatSun } from './find-sun';
import { findUnhuntable } from './find-unhuntable';
import { FINDING_CODES, type Finding, type SetupInput } from './setup-types';

/** A place told by one rule is not told again by the next. */
function firstOfEach(...rules: Finding[][]): Finding[] {
  const told = new Set<string>();
  return rules.flatMap((found) => {
    const fresh = found.filter((f) => !told.has(f.subject.id));
    for (const f of fresh) told.add(f.subject.id);
    return fresh;
  });
}

/**
 * Faults of a club's ground: what draws deer off the shot, onto the walk or away from the line they should travel, ways that
 * give the sit away, and sun in eyes and cameras. Distances in metres, bearings in degrees true. Rules and distances are
 * practice (settings). In order of rule, then stand, then name; the same input gives the same findings. Never throws.
 */
export function checkSetup(asked: SetupInput): Finding[] {
  // The order in which things are listed is no part of the ground: prints may not hang on it.
  const byId = <T extends { id: string }>(list: T[]) => [...list].sort((a, b) => a.id.localeCompare(b.id));
  const input = {
    ...asked,
    stands: byId(asked.stands),
    features: byId(asked.features),
    approaches: byId(asked.approaches),
  };
  const ways = findApproachFaults(input);
  const toldWays = new Set(ways.map((f) => f.subject.id));
  const found = [
    ...firstOfEach(findOffShot(input), findUnhuntable(input), findOffLines(input)),
    ...findBesideApproach(input, toldWays),
    ...findCrowdedScrapes(input),
    ...ways,
    ...findSeatSun(input),
    ...findCameraSun(input),
  ];
  // A feature of several parts is told once.
  const once = [...new Map(found.map((f) => [f.key, f])).values()];
  const name = (f: Finding) => `${f.stand?.name ?? ''} ${f.subject.name}`;
  return once.sort(
    (a, b) => FINDING_CODES.indexOf(a.code) - FINDING_CODES.indexOf(b.code) || name(a).localeCompare(name(b)),
  );
}
