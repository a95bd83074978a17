'use client';

import type { ReactNode } from 'react';
import { TextLink } from '@/ui/button';
import { type DataColumn, DataTable } from '@/ui/data-table';
import { Badge } from '@/ui/page-parts';
import type { StandLine } from '../view';
import { SUITABILITY_WORDS } from '../words/kinds';
import { STANDS_WORDS } from '../words/stand';
import { ArcBars } from './arc-bars';

const RANK = { prime: 0, usable: 1, avoid: 2 } as const;

type Row = StandLine & { href: string };

function Winds({ arcs, words }: { arcs: StandLine['morningArcs']; words: string }) {
  if (arcs.length === 0) return <span className="text-ink-soft">{STANDS_WORDS.noneSet}</span>;
  return (
    <span className="inline-block">
      <ArcBars arcs={arcs} className="max-w-full" />
      <span className="text-sm">{words}</span>
    </span>
  );
}

const COLUMNS: readonly DataColumn<Row>[] = [
  {
    id: 'name',
    header: STANDS_WORDS.stand,
    value: (row) => row.name,
    cell: (row) => <TextLink href={row.href}>{row.name}</TextLink>,
  },
  { id: 'kind', header: STANDS_WORDS.kind, value: (row) => row.kind },
  {
    id: 'morningWinds',
    header: STANDS_WORDS.morningWinds,
    value: (row) => row.morningWinds,
    cell: (row) => <Winds arcs={row.morningArcs} words={row.morningWinds} />,
  },
  {
    id: 'eveningWinds',
    header: STANDS_WORDS.eveningWinds,
    value: (row) => row.eveningWinds,
    cell: (row) => <Winds arcs={row.eveningArcs} words={row.eveningWinds} />,
  },
  {
    id: 'morning',
    header: STANDS_WORDS.morning,
    value: (row) => RANK[row.morning],
    cell: (row) => SUITABILITY_WORDS[row.morning],
  },
  {
    id: 'evening',
    header: STANDS_WORDS.evening,
    value: (row) => RANK[row.evening],
    cell: (row) => SUITABILITY_WORDS[row.evening],
  },
  { id: 'restDays', header: STANDS_WORDS.restDays, value: (row) => row.restDays, align: 'right' },
  {
    id: 'closed',
    header: STANDS_WORDS.open,
    value: (row) => row.closed,
    cell: (row) => (row.closed === '' ? STANDS_WORDS.open : <ClosedText text={row.closed} now={row.closedNow} />),
  },
];

/** Its first word stands out. */
function ClosedText({ text, now }: { text: string; now: boolean }) {
  const [word = '', ...rest] = text.split(' ');
  return (
    <span>
      <Badge look={now ? 'clay' : 'plain'}>{word}</Badge> {rest.join(' ')}
    </span>
  );
}

export function StandsTable({ club, lines, empty }: { club: string; lines: StandLine[]; empty: ReactNode }) {
  const rows = lines.map((line) => ({ ...line, href: `/clubs/${club}/stands/${line.id}` }));
  return (
    <DataTable
      caption={STANDS_WORDS.caption}
      captionHidden
      rows={rows}
      columns={COLUMNS}
      rowId={(row) => row.id}
      filterLabel={STANDS_WORDS.find}
      initialSort={{ id: 'name' }}
      empty={empty}
    />
  );
}
