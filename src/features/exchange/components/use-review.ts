'use client';

import { useMemo, useState } from 'react';
import { type Fate, fateOf } from '../fate';
import type { ReviewRow } from '../review';

export interface Choice {
  kind: string;
  taken: boolean;
}

export interface Judged {
  row: ReviewRow;
  choice: Choice;
  fate: Fate;
}

const first = (row: ReviewRow): Choice => ({ kind: row.kind, taken: fateOf(row, row.kind) === 'ready' });

/** What a person has chosen for each row of a file. */
export function useReview(rows: ReviewRow[]) {
  const [changed, setChanged] = useState<ReadonlyMap<number, Choice>>(new Map());
  const judged = useMemo(
    () =>
      rows.map((row): Judged => {
        const choice = changed.get(row.row) ?? first(row);
        return { row, choice, fate: fateOf(row, choice.kind) };
      }),
    [rows, changed],
  );
  const put = (choices: [number, Choice][]) => setChanged((before) => new Map([...before, ...choices]));
  return {
    judged,
    taken: judged.filter(({ choice, fate }) => choice.taken && choice.kind !== '' && fate !== 'cannot'),
    /** A row given a kind is meant to be taken, unless it is there already. */
    setKind: (row: ReviewRow, kind: string) => put([[row.row, { kind, taken: fateOf(row, kind) === 'ready' }]]),
    setTaken: (row: ReviewRow, kind: string, taken: boolean) => put([[row.row, { kind, taken }]]),
    /** The same kind for every row of one shape that has none yet. */
    fill: (shape: ReviewRow['shape'], kind: string) =>
      put(
        judged
          .filter(({ row, fate }) => fate === 'choose' && row.shape === shape)
          .map(({ row }) => [row.row, { kind, taken: fateOf(row, kind) === 'ready' }]),
      ),
    takeAll: (taken: boolean) =>
      put(
        judged.filter(({ fate }) => fate === 'ready').map(({ row, choice }) => [row.row, { kind: choice.kind, taken }]),
      ),
  };
}
