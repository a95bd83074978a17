'use client';

import { type DataColumn, DataTable } from '@/ui/data-table';
import type { LogLine } from '../reads';

const COLUMNS: DataColumn<LogLine>[] = [
  { id: 'stand', header: 'Stand', value: (line) => line.standName },
  { id: 'when', header: 'When', value: (line) => line.whenText, sortable: false },
  { id: 'member', header: 'Member', value: (line) => line.memberName },
  { id: 'deer', header: 'Deer', value: (line) => line.counts, sortable: false },
  { id: 'bumped', header: 'Bumped', value: (line) => line.bumps || 'None', sortable: false },
  { id: 'shot', header: 'Shot', value: (line) => line.shot || 'None', sortable: false },
  { id: 'notes', header: 'Notes', value: (line) => line.notes || '–', sortable: false },
];

export function AllLogs({ logs }: { logs: LogLine[] }) {
  return (
    <DataTable
      caption="Logs of the season, the latest first"
      captionHidden
      rows={logs}
      columns={COLUMNS}
      rowId={(line) => line.sitId}
      filterLabel="Find a log"
      pageSize={12}
    />
  );
}
