'use client';

import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { type DataColumn, DataTable } from '@/ui/data-table';
import { Dialog, DialogClose } from '@/ui/dialog';
import { Menu } from '@/ui/menu';
import { Tabs } from '@/ui/tabs';
import { useToast } from '@/ui/toast';

interface Row {
  name: string;
  kind: string;
  height: number | null;
  rest: number;
}

const KINDS = ['Ladder', 'Hang-on', 'Box blind', 'Ground blind'];
const NAMES = [
  'Heron Pond',
  'Lower Oats',
  'Split Beech',
  'Old Orchard',
  'Tanner Ridge',
  'Mill Race',
  'Saddle',
  'Far Corner',
];
const ROWS: Row[] = NAMES.map((name, i) => ({
  name,
  kind: KINDS[i % KINDS.length] ?? '',
  height: i % 4 === 3 ? null : 12 + ((i * 5) % 9),
  rest: (i % 3) + 1,
}));

const COLUMNS: DataColumn<Row>[] = [
  { id: 'name', header: 'Stand', value: (row) => row.name },
  { id: 'kind', header: 'Kind', value: (row) => row.kind },
  { id: 'height', header: 'Height, ft', value: (row) => row.height, align: 'right' },
  { id: 'rest', header: 'Rest, days', value: (row) => row.rest, align: 'right' },
];

export function ShowTable() {
  return (
    <DataTable
      caption="Stands of the sample club"
      rows={ROWS}
      columns={COLUMNS}
      rowId={(row) => row.name}
      filterLabel="Find a stand"
      pageSize={5}
      initialSort={{ id: 'name' }}
    />
  );
}

export function ShowOverlays() {
  const toast = useToast();
  return (
    <div className="mt-4 grid gap-4">
      <div className="flex flex-wrap gap-3">
        <Menu
          label="Spring Hollow"
          items={[
            { label: 'Spring Hollow', href: '/dev/ui', current: true },
            { label: 'The home place', href: '/dev/ui' },
            { label: 'Leave the club', danger: true },
          ]}
        />
        <Dialog
          title="Book Heron Pond"
          description="Saturday 7 November, morning."
          trigger={<Button>Open a dialog</Button>}
        >
          <p>Be in by 6:05. Rest after it: 3 days.</p>
          <div className="mt-5 flex gap-3">
            <Button look="primary">Book this sit</Button>
            <DialogClose>
              <Button>Not now</Button>
            </DialogClose>
          </div>
        </Dialog>
        <ConfirmDialog
          title="Cancel this sit?"
          confirmLabel="Cancel the sit"
          keepLabel="Keep it"
          danger
          trigger={<Button>Ask first</Button>}
          onConfirm={async () => 'The sit has begun; sign out instead.'}
        >
          Heron Pond opens to others at once. The record stays.
        </ConfirmDialog>
        <Button onClick={() => toast({ title: 'Sit booked', text: 'Heron Pond, Saturday morning' })}>
          Say something
        </Button>
        <Button onClick={() => toast({ title: 'No signal', text: 'Kept here until it is back', level: 'caution' })}>
          Say a caution
        </Button>
      </div>
      <Tabs
        label="About the stand"
        tabs={[
          { id: 'why', label: 'Why', content: <p>Wind holds; the way in is short and dark.</p> },
          { id: 'walk', label: 'Walk', content: <p>Leave Creek Gate by 5:50.</p> },
          { id: 'log', label: 'Log', content: <p>Two sits this season.</p> },
        ]}
      />
    </div>
  );
}
