'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { DrawnShape } from '@/core/map-layers';
import type { Units } from '@/core/units';
import type { ClubCall } from '@/features/ground/components/form-types';
import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { Pager } from '@/ui/pager';
import { Table, TBody, THead, Th } from '@/ui/table';
import { Select } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { AtImport, SaveImport } from '../exchange-schema';
import type { Fate } from '../fate';
import type { ImportView } from '../read-import';
import { FATE_WORDS, REVIEW_ROW_WORDS, REVIEW_WORDS } from '../words/import';
import { FillKinds } from './fill-kinds';
import { ReviewTableRow } from './review-row';
import { useReview } from './use-review';

const row = REVIEW_ROW_WORDS;
const PAGE = 50;
const SHAPES: DrawnShape[] = ['point', 'line', 'area'];
const words = REVIEW_WORDS;
const FATES: Fate[] = ['ready', 'choose', 'twin', 'cannot'];
const SHOWN = FATES.map((value) => ({ value, label: FATE_WORDS[value] }));

interface ImportReviewProps {
  club: string;
  units: Units;
  view: ImportView;
  save: ClubCall<SaveImport, { added: number }>;
  swap: ClubCall<AtImport, { swapped: boolean }>;
}

/** Every row of a file with what becomes of it; only what is ticked is added. */
export function ImportReview({ club, units, view, save, swap }: ImportReviewProps) {
  const router = useRouter();
  const toast = useToast();
  const review = useReview(view.rows);
  const [page, setPage] = useState(1);
  const [only, setOnly] = useState('');
  const [busy, setBusy] = useState<'save' | 'swap' | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const { judged, taken } = review;
  const count = (fate: Fate) => judged.filter((one) => one.fate === fate).length;
  const seen = only === '' ? judged : judged.filter((one) => one.fate === only);
  const pages = Math.max(1, Math.ceil(seen.length / PAGE));
  const at = Math.min(page, pages);
  const here = { id: view.id, version: view.version };

  async function run<T>(kind: 'save' | 'swap', call: () => ReturnType<ClubCall<unknown, T>>, then: (data: T) => void) {
    setBusy(kind);
    setProblem(null);
    const answer = await call().catch(() => null);
    setBusy(null);
    if (!answer) setProblem(words.lost);
    else if (!answer.ok) setProblem(answer.error.message);
    else then(answer.data);
  }

  return (
    <div className="grid gap-4">
      {view.looksSwapped && (
        <Notice
          level="caution"
          title={words.swappedTitle}
          actions={
            <Button
              pending={busy === 'swap'}
              pendingLabel={words.swapping}
              onClick={() =>
                run(
                  'swap',
                  () => swap(club, here),
                  () => router.refresh(),
                )
              }
            >
              {words.swap}
            </Button>
          }
        >
          {words.swappedText}
        </Notice>
      )}
      {view.remarks.map((remark) => (
        <Notice key={remark}>{remark}</Notice>
      ))}
      <p>{words.counts(SHOWN.map(({ value, label }) => ({ label, count: count(value) })))}</p>
      {SHAPES.map((shape) => {
        const open = judged.filter(({ row, fate }) => fate === 'choose' && row.shape === shape).length;
        return (
          open > 0 && (
            <FillKinds
              key={shape}
              shape={shape}
              count={open}
              disabled={busy !== null}
              onFill={(kind) => review.fill(shape, kind)}
            />
          )
        );
      })}
      <div className="flex flex-wrap items-end gap-2">
        <Select
          label={words.show}
          value={only}
          onChange={({ target }) => {
            setOnly(target.value);
            setPage(1);
          }}
          options={[{ value: '', label: words.allRows }, ...SHOWN]}
        />
        <Button disabled={busy !== null} onClick={() => review.takeAll(true)}>
          {words.tickAll}
        </Button>
        <Button disabled={busy !== null} onClick={() => review.takeAll(false)}>
          {words.tickNone}
        </Button>
      </div>
      <Table caption={words.caption(view.fileName)} captionHidden>
        <THead>
          <Th>{row.add}</Th>
          <Th>{row.name}</Th>
          <Th>{row.shape}</Th>
          <Th>{row.kind}</Th>
          <Th>{row.fate}</Th>
        </THead>
        <TBody>
          {seen.slice((at - 1) * PAGE, at * PAGE).map((one) => (
            <ReviewTableRow
              key={one.row.row}
              judged={one}
              units={units}
              disabled={busy !== null}
              onKind={review.setKind}
              onTaken={review.setTaken}
            />
          ))}
        </TBody>
      </Table>
      {pages > 1 && <Pager page={at} pages={pages} onPage={setPage} summary={words.rows(seen.length)} />}
      {problem && (
        <Notice live level="caution" title={words.notAdded}>
          {problem}
        </Notice>
      )}
      <div>
        <Button
          look="primary"
          disabled={taken.length === 0}
          pending={busy === 'save'}
          pendingLabel={words.adding}
          onClick={() =>
            run(
              'save',
              () =>
                save(club, { ...here, rows: taken.map(({ row, choice }) => ({ row: row.row, kind: choice.kind })) }),
              ({ added }) => {
                toast({ title: words.added(added) });
                router.refresh();
              },
            )
          }
        >
          {taken.length === 0 ? words.nothingTicked : words.add(taken.length)}
        </Button>
      </div>
    </div>
  );
}
