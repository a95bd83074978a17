import { bearingDeg, distanceM, nearestOnShape } from '../geometry';
import type { Point, ScoredFeature, ScoredStand } from '../ground-types';
import { formatDistance } from '../units';
import { away, featureFacts, makeFinding, standFacts } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { canShoot, footPath, gapM, isLine, shotOf, windowsHunted } from './shot-of';
import { SCRAPE_WORDS } from './words/attractions';

interface Rated {
  scrape: ScoredFeature;
  at: Point;
  worth: number;
  reasons: string[];
  stand: ScoredStand | null;
}

function middle(feature: ScoredFeature): Point {
  if (feature.shape.type === 'point') return feature.shape.at;
  const points = feature.shape.type === 'line' ? feature.shape.points : (feature.shape.rings[0] ?? []);
  const sum = points.reduce((s, p) => ({ eastM: s.eastM + p.eastM, northM: s.northM + p.northM }), {
    eastM: 0,
    northM: 0,
  });
  return { eastM: sum.eastM / points.length, northM: sum.northM / points.length };
}

/** How good a scrape is to keep: on a line, a bow shot off on the shot side, away from the walk, not under the seat. */
function rate(scrape: ScoredFeature, input: SetupInput): Rated {
  const { settings, units } = input;
  const at = middle(scrape);
  const reasons: string[] = [];
  let worth = 0;
  const line = Math.min(
    Number.POSITIVE_INFINITY,
    ...input.features.filter(isLine).map((f) => gapM(scrape.shape, f.shape)),
  );
  if (line <= settings.onLineM) {
    worth += 2;
    reasons.push(SCRAPE_WORDS.onLine);
  }
  const seats = input.stands
    .filter((s) => windowsHunted(s).length > 0)
    .map((stand) => ({ stand, shot: shotOf(stand, scrape.shape, input) }))
    .sort((a, b) => a.shot.metres - b.shot.metres);
  const bow = seats.find(({ shot }) => shot.metres >= settings.scrapeFromM && shot.metres <= settings.scrapeToM);
  if (bow) {
    worth += 2;
    reasons.push(SCRAPE_WORDS.bowShot(formatDistance(bow.shot.metres, units), bow.stand.name));
  }
  if (seats.some(({ shot }) => canShoot(shot))) {
    worth += 1;
    reasons.push(SCRAPE_WORDS.onShotSide);
  }
  const walk = Math.min(
    Number.POSITIVE_INFINITY,
    ...input.approaches.flatMap((a) => footPath(a, 0).map((p) => distanceM(p, nearestOnShape(p, scrape.shape)))),
  );
  if (walk > settings.onLineM) {
    worth += 1;
    reasons.push(SCRAPE_WORDS.offWalk);
  }
  if ((seats[0]?.shot.metres ?? Number.POSITIVE_INFINITY) < settings.noiseM) {
    worth -= 3;
    reasons.push(SCRAPE_WORDS.nearSeat);
  }
  return { scrape, at, worth, reasons, stand: (bow ?? seats[0])?.stand ?? null };
}

function openings(scrapes: ScoredFeature[], openingM: number): ScoredFeature[][] {
  const left = [...scrapes];
  const groups: ScoredFeature[][] = [];
  while (left.length > 0) {
    const group = [left.shift() as ScoredFeature];
    for (let i = 0; i < group.length; i++) {
      const near = left.filter((s) => distanceM(middle(s), middle(group[i] as ScoredFeature)) <= openingM);
      for (const one of near) left.splice(left.indexOf(one), 1);
      group.push(...near);
    }
    groups.push(group);
  }
  return groups;
}

/** Several scrapes in one opening: one is worth more than many. Says which to keep. */
export function findCrowdedScrapes(input: SetupInput): Finding[] {
  const scrapes = input.features.filter((f) => f.kind === 'scrape').sort((a, b) => a.id.localeCompare(b.id));
  return openings(scrapes, input.settings.openingM)
    .filter((group) => group.length > 1)
    .flatMap((group) => {
      const rated = group.map((s) => rate(s, input)).sort((a, b) => b.worth - a.worth);
      const keep = rated[0];
      if (!keep) return [];
      const { stand, at, scrape } = keep;
      const rest = rated.slice(1);
      const where = stand ? { distanceM: distanceM(stand.at, at), bearingDeg: bearingDeg(stand.at, at) } : null;
      const seat =
        stand && where ? { stand: stand.name, away: away(where.distanceM, where.bearingDeg, input.units) } : null;
      return [
        makeFinding(
          {
            code: 'crowded_scrapes',
            subject: { of: 'feature', id: scrape.id, name: scrape.name },
            stand: stand && { id: stand.id, name: stand.name },
            at,
            distanceM: where?.distanceM ?? null,
            bearingDeg: where?.bearingDeg ?? null,
            text: SCRAPE_WORDS.text(group.length, scrape.name, seat),
            why: SCRAPE_WORDS.why(scrape.name, keep.reasons),
            acts: [
              {
                act: 'keep_one',
                text: SCRAPE_WORDS.keepOne(
                  scrape.name,
                  rest.map((r) => r.scrape.name),
                ),
                work: 'mock_scrape',
              },
            ],
            trial: stand && {
              change: 'without_features',
              standId: stand.id,
              featureIds: rest.map((r) => r.scrape.id),
              window: null,
            },
          },
          [group.map(featureFacts), stand && standFacts(stand)],
        ),
      ];
    });
}
