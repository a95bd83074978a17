'use client';

import { type DataColumn, DataTable } from '@/ui/data-table';
import type { LogLine } from '../reads';
import { ALL_LOGS_WORDS } from '../words/sightings';

const words = ALL_LOGS_WORDS;

const COLUMNS: DataColumn<LogLine>[] = [
  { id: 'stand', header: words.stand, value: (line) => line.standName },
  { id: 'when', header: words.when, value: (line) => line.whenText, sortable: false },
  { id: 'member', header: words.member, value: (line) => line.memberName },
  { id: 'deer', header: words.deer, value: (line) => line.counts, sortable: false },
  { id: 'bumped', header: words.bumped, value: (line) => line.bumps || words.none, sortable: false },
  { id: 'shot', header: words.shot, value: (line) => line.shot || words.none, sortable: false },
  { id: 'notes', header: words.notes, value: (line) => line.notes || '–', sortable: false },
];

export function AllLogs({ logs }: { logs: LogLine[] }) {
  return (
    <DataTable
      caption={words.caption}
      captionHidden
      rows={logs}
      columns={COLUMNS}
      rowId={(line) => line.sitId}
      filterLabel={words.find}
      pageSize={12}
    />
  );
}
