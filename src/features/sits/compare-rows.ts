import type { ClubView, ReasonView, SitDetailView } from './view-types';
import { WAYS_WORDS, COMPARE_ROW_WORDS as WORDS } from './words/detail';
import { clockText, minutesText, pointsText } from './words/terms';

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
  if (!hold) return [WORDS.notKnown];
  const leaves = hold.leavesAt === null ? [] : [WORDS.outAt(clockText(hold.leavesAt, club))];
  return [WORDS.hold(percent(hold.share)), ...leaves];
}

function wayLines({ ways: [way] }: SitDetailView, club: ClubView): string[] {
  if (!way) return [WORDS.noWay];
  return [
    WAYS_WORDS.nameAndTime(way.name, way.entry),
    WORDS.leave(clockText(way.leaveBy, club), clockText(way.inBy, club)),
    WORDS.walking(minutesText(way.walkSeconds)),
  ];
}

function reasonLines(reasons: ReasonView[], sign: 1 | -1): string[] {
  const lines = reasons
    .filter((reason) => Math.round(reason.change) * sign > 0)
    .slice(0, MOST_REASONS)
    .map((reason) => `${pointsText(reason.change)} ${reason.text}`);
  return lines.length > 0 ? lines : [WORDS.nothing];
}

/** Two stands of one window line by line, for a table of two columns. */
export function compareRows(pair: [SitDetailView, SitDetailView], club: ClubView): CompareRow[] {
  const lines = (label: string, of: (one: SitDetailView) => string[]): CompareRow => ({
    label,
    texts: pair.map(of),
    better: null,
  });
  const holds: [number, number] = [100 * (pair[0].hold?.share ?? 0), 100 * (pair[1].hold?.share ?? 0)];
  const chance = (share: number | null) => (share === null ? [WORDS.notKnown] : [percent(share)]);
  return [
    lines(WORDS.word, (one) => [one.word]),
    figure(WORDS.score, pair, (one) => one.score),
    figure(WORDS.quiet, pair, (one) => one.quiet),
    figure(WORDS.promise, pair, (one) => one.promise),
    { ...lines(WORDS.wind, (one) => windLines(one, club)), better: moreOf(holds) },
    lines(WORDS.winded, (one) => chance(one.windedChance)),
    lines(WORDS.wayIn, (one) => wayLines(one, club)),
    lines(WORDS.alert, ({ ways: [way] }) =>
      way ? [WORDS.inAndOut(percent(way.inChance), percent(way.outChance))] : [WORDS.notKnown],
    ),
    lines(WORDS.speaksFor, (one) => reasonLines(one.reasons, 1)),
    lines(WORDS.speaksAgainst, (one) => reasonLines(one.reasons, -1)),
    lines(WORDS.care, (one) =>
      one.cautions.length > 0 ? one.cautions.map(({ text }) => text) : [WORDS.nothingSpecial],
    ),
    lines(WORDS.sure, (one) => [one.confidence.text]),
  ];
}
