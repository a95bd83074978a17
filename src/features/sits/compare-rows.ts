import type { ClubView, ReasonView, SitDetailView } from './view-types';
import { clockText, minutesText, pointsText } from './words';

export interface CompareRow {
  label: string;
  /** A text for each stand, or several lines. */
  texts: string[][];
  /** Index of the stand that is better in it; null: neither, or not to be said. */
  better: number | null;
}

const MOST_REASONS = 3;
const percent = (share: number) => `${Math.round(share * 100)} %`;

/** Which of two is more, as far as they differ when told in whole points. */
function moreOf([a, b]: [number, number]): number | null {
  if (Math.round(a) === Math.round(b)) return null;
  return a > b ? 0 : 1;
}

function figure(label: string, pair: [SitDetailView, SitDetailView], of: (one: SitDetailView) => number): CompareRow {
  const values: [number, number] = [of(pair[0]), of(pair[1])];
  return { label, texts: values.map((value) => [String(Math.round(value))]), better: moreOf(values) };
}

function windLines({ hold }: SitDetailView, club: ClubView): string[] {
  if (!hold) return ['Not known'];
  const leaves = hold.leavesAt === null ? [] : [`Likeliest out of it at ${clockText(hold.leavesAt, club)}`];
  return [`In a good arc ${percent(hold.share)} of the sit`, ...leaves];
}

function wayLines({ ways: [way] }: SitDetailView, club: ClubView): string[] {
  if (!way) return ['None is drawn'];
  return [
    `${way.name}, ${way.entry}`,
    `Leave by ${clockText(way.leaveBy, club)}, in by ${clockText(way.inBy, club)}`,
    `${minutesText(way.walkSeconds)} of walking`,
  ];
}

function reasonLines(reasons: ReasonView[], sign: 1 | -1): string[] {
  const lines = reasons
    .filter((reason) => Math.round(reason.change) * sign > 0)
    .slice(0, MOST_REASONS)
    .map((reason) => `${pointsText(reason.change)} ${reason.text}`);
  return lines.length > 0 ? lines : ['Nothing of weight'];
}

/** Two stands of one window line by line, for a table of two columns. */
export function compareRows(pair: [SitDetailView, SitDetailView], club: ClubView): CompareRow[] {
  const lines = (label: string, of: (one: SitDetailView) => string[]): CompareRow => ({
    label,
    texts: pair.map(of),
    better: null,
  });
  const holds: [number, number] = [100 * (pair[0].hold?.share ?? 0), 100 * (pair[1].hold?.share ?? 0)];
  const chance = (share: number | null) => (share === null ? ['Not known'] : [percent(share)]);
  return [
    lines('Word', (one) => [one.word]),
    figure('Sit score', pair, (one) => one.score),
    figure('Quiet', pair, (one) => one.quiet),
    figure('Promise', pair, (one) => one.promise),
    { ...lines('Wind', (one) => windLines(one, club)), better: moreOf(holds) },
    lines('Chance of being winded', (one) => chance(one.windedChance)),
    lines('Way in', (one) => wayLines(one, club)),
    lines('Chance of alerting deer, in and out', ({ ways: [way] }) =>
      way ? [`${percent(way.inChance)} and ${percent(way.outChance)}`] : ['Not known'],
    ),
    lines('Speaks for it', (one) => reasonLines(one.reasons, 1)),
    lines('Speaks against it', (one) => reasonLines(one.reasons, -1)),
    lines('Take care', (one) => (one.cautions.length > 0 ? one.cautions.map(({ text }) => text) : ['Nothing special'])),
    lines('How sure', (one) => [one.confidence.text]),
  ];
}
