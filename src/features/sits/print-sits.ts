import { formatDay } from '@/core/day-time';
import type { SitRow, SitsView } from './view-types';
import { PRINT_WORDS as WORDS } from './words/reads';
import { clockText } from './words/terms';

interface Line {
  rank: string;
  name: string;
  word: string;
  score: string;
  quiet: string;
  promise: string;
  sure: string;
  sentence: string;
}

const HEADS: Line = {
  rank: '#',
  name: WORDS.stand,
  word: WORDS.word,
  score: WORDS.score,
  quiet: WORDS.quiet,
  promise: WORDS.promise,
  sure: WORDS.sure,
  sentence: WORDS.line,
};

function line(row: SitRow, rank: string, sentence: string): Line {
  const { name, word, confidence } = row;
  const figure = (value: number) => value.toFixed(1);
  const figures = { score: figure(row.score), quiet: figure(row.quiet), promise: figure(row.promise) };
  return { rank, name, word, ...figures, sure: confidence, sentence };
}

/** The list as a plain table for a terminal. */
export function printSits(view: SitsView): string {
  const { window, club } = view;
  const lines = [
    ...view.open.map((row) => line(row, String(row.rank), row.sentence)),
    ...view.blocked.map((row) => line(row, '-', row.gates.map((gate) => gate.text).join(' '))),
  ];
  const keys = ['rank', 'name', 'word', 'score', 'quiet', 'promise', 'sure'] as const;
  const widths = keys.map((key) => Math.max(...[HEADS, ...lines].map((one) => one[key].length)));
  const right = new Set(['rank', 'score', 'quiet', 'promise']);
  const text = (one: Line) =>
    [
      ...keys.map((key, i) => (right.has(key) ? one[key].padStart(widths[i] ?? 0) : one[key].padEnd(widths[i] ?? 0))),
      one.sentence,
    ].join('  ');
  const span = WORDS.span(clockText(window.startAt, club), clockText(window.endAt, club));
  const weather = view.weather ? `${view.weather.wind}; ${view.weather.air}` : WORDS.noForecast;
  return [
    `${club.name}: ${formatDay(window.day, true)}, ${window.window}, ${span} (${club.zone})`,
    WORDS.forecast(weather, view.forecast.source, view.forecast.error),
    '',
    ...[HEADS, ...lines].map(text),
  ].join('\n');
}
