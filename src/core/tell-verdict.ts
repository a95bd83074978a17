import { counterfactualsFor } from './counterfactuals';
import { type ReasonFacts, reasonsFor } from './reasons';
import type { SitFrame } from './sit-frame';
import { timelineOf } from './timeline';
import type { SitSums } from './verdict';
import type { Verdict } from './verdict-types';
import { REASON_WORDS } from './words/reasons';

const DAY_MS = 86_400_000;
/** Places reached less than this are not named. */
const LEAST_NAMED = 0.02;
const MOST_NAMED = 8;

function scentList(frame: SitFrame, sums: SitSums): Verdict['scentByFeature'] {
  const { features } = frame.ground.input;
  const list: Verdict['scentByFeature'] = [];
  sums.scent?.byFeature.forEach((chance, i) => {
    const feature = features[i];
    if (feature && chance >= LEAST_NAMED) list.push({ featureId: feature.id, featureName: feature.name, chance });
  });
  return list.sort((a, b) => b.chance - a.chance || (a.featureId < b.featureId ? -1 : 1)).slice(0, MOST_NAMED);
}

function factsOf(frame: SitFrame, sums: SitSums, verdict: Verdict): ReasonFacts {
  const { features, settings } = frame.ground.input;
  const { stand } = sums;
  const first = sums.ways[0]?.tried;
  const top = verdict.scentByFeature[0];
  const worst = (w: { feature: number; chance: number } | null | undefined) => {
    const feature = w ? features[w.feature] : undefined;
    return w && feature && w.chance >= LEAST_NAMED ? { name: feature.name, chance: w.chance } : null;
  };
  const { startAt } = frame.window.window;
  const recent = stand.near.filter(({ event, nearness }) => {
    const age = startAt - event.at;
    return nearness > 0.1 && age >= 0 && age < settings.pressure.halfLifeDays * 3 * DAY_MS;
  });
  const used = stand.inRange
    .filter((r) => frame.window.shares.some((row) => (row[r.feature] as number) > 0))
    .sort((a, b) => b.share - a.share || a.feature - b.feature);
  const { span } = sums.glare;
  return {
    arcShare: sums.arcs.share,
    arcsKnown: sums.arcs.known,
    forecast: frame.air !== null,
    topScent: top ? { name: top.featureName } : null,
    windedChance: verdict.windedChance,
    wayName: first?.way.approach.name ?? null,
    outName: first?.outName ?? null,
    unknownWayChance: settings.approach.unknownWayChance,
    inChance: first?.in.chance ?? 0,
    inWorst: worst(first?.in.worst),
    outChance: first?.out.chance ?? 0,
    outWorst: worst(first?.out.worst),
    suitability: stand.stand.suitability[frame.window.window.window],
    featuresInRange: used.map((r) => features[r.feature]?.name ?? '').filter((name) => name !== ''),
    sunSpan: span ? REASON_WORDS.span(frame.clock(span.from), frame.clock(span.to)) : null,
    recentEvents: recent.length,
    inByText: verdict.approach ? frame.clock(verdict.approach.inBy) : '',
    ratePerHour: stand.sightings.ratePerHour,
    clubRatePerHour: frame.ground.clubRatePerHour,
  };
}

/** Adds to a verdict what a person argues with: places reached, reasons, counterfactuals, timeline. */
export function tellVerdict(frame: SitFrame, sums: SitSums, verdict: Verdict): Verdict {
  const { settings } = frame.ground.input;
  const told = { ...verdict, scentByFeature: scentList(frame, sums) };
  const facts = factsOf(frame, sums, told);
  return {
    ...told,
    reasons: reasonsFor(sums.best.factors, facts, settings.promise.suitability.usable, settings.score),
    counterfactuals: counterfactualsFor(frame, sums),
    timeline: timelineOf(frame, sums),
  };
}
