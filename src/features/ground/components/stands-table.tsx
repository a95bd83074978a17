'use client';

import type { ReactNode } from 'react';
import { TextLink } from '@/ui/button';
import { type DataColumn, DataTable } from '@/ui/data-table';
import { Badge } from '@/ui/page-parts';
import type { StandLine } from '../view';
import { SUITABILITY_WORDS } from '../words';
import { ArcBars } from './arc-bars';

const RANK = { prime: 0, usable: 1, avoid: 2 } as const;

type Row = StandLine & { href: string };

function Winds({ arcs, words }: { arcs: StandLine['morningArcs']; words: string }) {
  if (arcs.length === 0) return <span className="text-ink-soft">None set</span>;
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
    header: 'Stand',
    value: (row) => row.name,
    cell: (row) => <TextLink href={row.href}>{row.name}</TextLink>,
  },
  { id: 'kind', header: 'Kind', value: (row) => row.kind },
  {
    id: 'morningWinds',
    header: 'Morning winds',
    value: (row) => row.morningWinds,
    cell: (row) => <Winds arcs={row.morningArcs} words={row.morningWinds} />,
  },
  {
    id: 'eveningWinds',
    header: 'Evening winds',
    value: (row) => row.eveningWinds,
    cell: (row) => <Winds arcs={row.eveningArcs} words={row.eveningWinds} />,
  },
  {
    id: 'morning',
    header: 'Morning',
    value: (row) => RANK[row.morning],
    cell: (row) => SUITABILITY_WORDS[row.morning],
  },
  {
    id: 'evening',
    header: 'Evening',
    value: (row) => RANK[row.evening],
    cell: (row) => SUITABILITY_WORDS[row.evening],
  },
  { id: 'restDays', header: 'Rest days', value: (row) => row.restDays, align: 'right' },
  {
    id: 'closed',
    header: 'Open',
    value: (row) => row.closed,
    cell: (row) => (row.closed === '' ? 'Open' : <ClosedText text={row.closed} />),
  },
];

function ClosedText({ text }: { text: string }) {
  const [word = '', ...rest] = text.split(' ');
  return (
    <span>
      <Badge look={word === 'Closed' ? 'clay' : 'plain'}>{word}</Badge> {rest.join(' ')}
    </span>
  );
}

export function StandsTable({ club, lines, empty }: { club: string; lines: StandLine[]; empty: ReactNode }) {
  const rows = lines.map((line) => ({ ...line, href: `/clubs/${club}/stands/${line.id}` }));
  return (
    <DataTable
      caption="The club's stands"
      captionHidden
      rows={rows}
      columns={COLUMNS}
      rowId={(row) => row.id}
      filterLabel="Find a stand by name, kind, wind or closure"
      initialSort={{ id: 'name' }}
      empty={empty}
    />
  );
}
