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
import { FillKinds } from './fill-kinds';
import { ReviewTableRow } from './review-row';
import { useReview } from './use-review';

const PAGE = 50;
const SHAPES: DrawnShape[] = ['point', 'line', 'area'];
const LOST = 'The server could not be reached. Your choices are still here: try again.';
const SHOWN: { value: Fate; label: string }[] = [
  { value: 'ready', label: 'Will be added' },
  { value: 'choose', label: 'Kind not known' },
  { value: 'twin', label: 'There already' },
  { value: 'cannot', label: 'Cannot be taken' },
];

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
    if (!answer) setProblem(LOST);
    else if (!answer.ok) setProblem(answer.error.message);
    else then(answer.data);
  }

  return (
    <div className="grid gap-4">
      {view.looksSwapped && (
        <Notice
          level="caution"
          title="Latitude and longitude look swapped"
          actions={
            <Button
              pending={busy === 'swap'}
              pendingLabel="Swapping…"
              onClick={() =>
                run(
                  'swap',
                  () => swap(club, here),
                  () => router.refresh(),
                )
              }
            >
              Swap them
            </Button>
          }
        >
          As they stand the places lie far from the club; the other way round they lie on it.
        </Notice>
      )}
      {view.remarks.map((remark) => (
        <Notice key={remark}>{remark}</Notice>
      ))}
      <p>{SHOWN.map(({ value, label }) => `${label}: ${count(value)}`).join(' · ')}</p>
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
          label="Show"
          value={only}
          onChange={({ target }) => {
            setOnly(target.value);
            setPage(1);
          }}
          options={[{ value: '', label: 'All rows' }, ...SHOWN]}
        />
        <Button disabled={busy !== null} onClick={() => review.takeAll(true)}>
          Tick all that can be added
        </Button>
        <Button disabled={busy !== null} onClick={() => review.takeAll(false)}>
          Tick none
        </Button>
      </div>
      <Table caption={`Rows of ${view.fileName}`} captionHidden>
        <THead>
          <Th>Add</Th>
          <Th>Name</Th>
          <Th>Shape</Th>
          <Th>What it is</Th>
          <Th>What becomes of it</Th>
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
      {pages > 1 && <Pager page={at} pages={pages} onPage={setPage} summary={`${seen.length} rows`} />}
      {problem && (
        <Notice live level="caution" title="Nothing was added">
          {problem}
        </Notice>
      )}
      <div>
        <Button
          look="primary"
          disabled={taken.length === 0}
          pending={busy === 'save'}
          pendingLabel="Adding…"
          onClick={() =>
            run(
              'save',
              () =>
                save(club, { ...here, rows: taken.map(({ row, choice }) => ({ row: row.row, kind: choice.kind })) }),
              ({ added }) => {
                toast({ title: `${added} added to the ground` });
                router.refresh();
              },
            )
          }
        >
          {taken.length === 0 ? 'Nothing is ticked' : `Add ${taken.length} to the ground`}
        </Button>
      </div>
    </div>
  );
}
