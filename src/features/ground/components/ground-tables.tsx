'use client';

import type { ReactNode } from 'react';
import { TextLink } from '@/ui/button';
import { type DataColumn, DataTable } from '@/ui/data-table';
import type { FeatureLine, ParkingLine } from '../view';
import { GROUND_TABLE_WORDS } from '../words/forms';

type FeatureRow = FeatureLine & { href: string };
type ParkingRow = ParkingLine & { href: string };

const FEATURE_COLUMNS: readonly DataColumn<FeatureRow>[] = [
  {
    id: 'name',
    header: GROUND_TABLE_WORDS.feature,
    value: (row) => row.name,
    cell: (row) => <TextLink href={row.href}>{row.name}</TextLink>,
  },
  { id: 'kind', header: GROUND_TABLE_WORDS.kind, value: (row) => row.kind },
  { id: 'shape', header: GROUND_TABLE_WORDS.drawnAs, value: (row) => row.shape },
  {
    id: 'size',
    header: GROUND_TABLE_WORDS.size,
    value: (row) => row.size,
    sortable: false,
    filterable: false,
    align: 'right',
  },
  { id: 'months', header: GROUND_TABLE_WORDS.months, value: (row) => row.months },
];

const PARKING_COLUMNS: readonly DataColumn<ParkingRow>[] = [
  {
    id: 'name',
    header: GROUND_TABLE_WORDS.parkingPlace,
    value: (row) => row.name,
    cell: (row) => <TextLink href={row.href}>{row.name}</TextLink>,
  },
  { id: 'place', header: GROUND_TABLE_WORDS.latitudeLongitude, value: (row) => row.place },
  { id: 'approaches', header: GROUND_TABLE_WORDS.approaches, value: (row) => row.approaches, align: 'right' },
  { id: 'notes', header: GROUND_TABLE_WORDS.notes, value: (row) => row.notes },
];

interface TableProps<Line> {
  club: string;
  lines: Line[];
  empty: ReactNode;
}

export function FeaturesTable({ club, lines, empty }: TableProps<FeatureLine>) {
  return (
    <DataTable
      caption={GROUND_TABLE_WORDS.featuresCaption}
      captionHidden
      rows={lines.map((line) => ({ ...line, href: `/clubs/${club}/ground/features/${line.id}` }))}
      columns={FEATURE_COLUMNS}
      rowId={(row) => row.id}
      filterLabel={GROUND_TABLE_WORDS.find}
      initialSort={{ id: 'name' }}
      empty={empty}
    />
  );
}

export function ParkingsTable({ club, lines, empty }: TableProps<ParkingLine>) {
  return (
    <DataTable
      caption={GROUND_TABLE_WORDS.parkingsCaption}
      captionHidden
      rows={lines.map((line) => ({ ...line, href: `/clubs/${club}/ground/parking/${line.id}` }))}
      columns={PARKING_COLUMNS}
      rowId={(row) => row.id}
      initialSort={{ id: 'name' }}
      empty={empty}
    />
  );
}
