'use client';

import type { ReactNode } from 'react';
import { TextLink } from '@/ui/button';
import { type DataColumn, DataTable } from '@/ui/data-table';
import type { FeatureLine, ParkingLine } from '../view';

type FeatureRow = FeatureLine & { href: string };
type ParkingRow = ParkingLine & { href: string };

const FEATURE_COLUMNS: readonly DataColumn<FeatureRow>[] = [
  {
    id: 'name',
    header: 'Feature',
    value: (row) => row.name,
    cell: (row) => <TextLink href={row.href}>{row.name}</TextLink>,
  },
  { id: 'kind', header: 'Kind', value: (row) => row.kind },
  { id: 'shape', header: 'Drawn as', value: (row) => row.shape },
  { id: 'size', header: 'Size', value: (row) => row.size, sortable: false, filterable: false, align: 'right' },
  { id: 'months', header: 'Months', value: (row) => row.months },
];

const PARKING_COLUMNS: readonly DataColumn<ParkingRow>[] = [
  {
    id: 'name',
    header: 'Parking place',
    value: (row) => row.name,
    cell: (row) => <TextLink href={row.href}>{row.name}</TextLink>,
  },
  { id: 'place', header: 'Latitude, longitude', value: (row) => row.place },
  { id: 'approaches', header: 'Approaches', value: (row) => row.approaches, align: 'right' },
  { id: 'notes', header: 'Notes', value: (row) => row.notes },
];

interface TableProps<Line> {
  club: string;
  lines: Line[];
  empty: ReactNode;
}

export function FeaturesTable({ club, lines, empty }: TableProps<FeatureLine>) {
  return (
    <DataTable
      caption="Features deer use"
      captionHidden
      rows={lines.map((line) => ({ ...line, href: `/clubs/${club}/ground/features/${line.id}` }))}
      columns={FEATURE_COLUMNS}
      rowId={(row) => row.id}
      filterLabel="Find a feature by name, kind or month"
      initialSort={{ id: 'name' }}
      empty={empty}
    />
  );
}

export function ParkingsTable({ club, lines, empty }: TableProps<ParkingLine>) {
  return (
    <DataTable
      caption="Parking places"
      captionHidden
      rows={lines.map((line) => ({ ...line, href: `/clubs/${club}/ground/parking/${line.id}` }))}
      columns={PARKING_COLUMNS}
      rowId={(row) => row.id}
      initialSort={{ id: 'name' }}
      empty={empty}
    />
  );
}
