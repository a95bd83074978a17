import { dayOf, monthOf } from '@/core/day-time';
import { cropYearOf } from '@/core/map-layers';
import { chainMovement, type MovementLine, type Stop } from '@/core/movement/chain-movement';
import { SECTOR_NAMES } from '@/core/sectors';
import { DEFAULT_SETTINGS } from '@/core/settings';
import { completeSetup } from '@/core/setup-check/setup-settings';
import type { WindowName } from '@/core/types';
import { formatDistance, type Units } from '@/core/units';
import { loadGround } from '@/features/ground/data';
import { featuresInYear } from '@/features/ground/features-in-year';
import { groundToCore } from '@/features/ground/to-core';
import { getSetupSettings } from '@/features/setup/settings-data';
import type { ClubScope } from '@/server/scope';

export interface LineView {
  id: string;
  name: string;
  length: string;
  /** Deer's way, for people; null: not known. */
  way: string | null;
  legs: {
    key: string;
    from: string;
    to: string;
    length: string;
    stands: { id: string; name: string; when: string }[];
  }[];
  gaps: string[];
}

/** Points that lie side by side as spans: 'NW-NE', 'S'. */
export function windSpans(points: number[]): string {
  if (points.length === 16) return 'any wind';
  const held = new Set(points);
  const starts = points.filter((p) => !held.has((p + 15) % 16));
  return starts
    .map((start) => {
      let end = start;
      while (held.has((end + 1) % 16)) end = (end + 1) % 16;
      return start === end ? SECTOR_NAMES[start] : `${SECTOR_NAMES[start]}-${SECTOR_NAMES[end]}`;
    })
    .join(', ');
}

const WINDOW_WORDS: Record<WindowName, string> = { morning: 'mornings', evening: 'evenings' };

function whenText(windows: MovementLine['legs'][number]['stands'][number]['windows']): string {
  const texts = windows.map(({ window, winds }) => ({ window, winds: windSpans(winds) }));
  const [first, second] = texts;
  if (first && second && first.winds === second.winds) return `mornings and evenings on ${first.winds}`;
  return texts.map(({ window, winds }) => `${WINDOW_WORDS[window]} on ${winds}`).join('; ');
}

function wayText({ way, stops }: MovementLine): string | null {
  const [first, last] = [stops[0], stops.at(-1)];
  if (way.morning === null || !first || !last) return null;
  const ends = (forward: boolean): [Stop, Stop] => (forward ? [first, last] : [last, first]);
  const [from, to] = ends(way.morning === 1);
  return `Mornings from ${from.name} to ${to.name}, evenings the other way.`;
}

function lineView(line: MovementLine, units: Units): LineView {
  return {
    id: line.id,
    name: line.name,
    length: formatDistance(line.lengthM, units),
    way: wayText(line),
    legs: line.legs.map((leg) => ({
      key: `${leg.from.name}|${leg.to.name}|${leg.from.alongM}`,
      from: leg.from.name,
      to: leg.to.name,
      length: formatDistance(leg.lengthM, units),
      stands: leg.stands.map(({ standId, name, windows }) => ({ id: standId, name, when: whenText(windows) })),
    })),
    gaps: line.gaps.map((gap) => `${formatDistance(gap.toM - gap.fromM, units)} between ${gap.between}`),
  };
}

/** The lines deer travel this month, with what lies on them and who can sit on each leg. */
export async function readMovement(scope: ClubScope, now: number): Promise<{ lines: LineView[]; month: number }> {
  const { club } = scope;
  const today = dayOf(now, club.zone);
  const rows = await loadGround(scope);
  const core = groundToCore(club, { ...rows, features: featuresInYear(rows.features, cropYearOf(today)) });
  const { own } = await getSetupSettings(scope);
  const month = monthOf(today);
  const features = core.features.filter((f) => f.months.includes(month));
  const lines = chainMovement({ features, stands: core.stands, scoring: DEFAULT_SETTINGS, setup: completeSetup(own) });
  return { lines: lines.map((line) => lineView(line, club.units)), month };
}
