'use client';

import { TextLink } from '@/ui/button';
import { type DataColumn, DataTable } from '@/ui/data-table';
import type { MemberView } from '../read-members';
import { MEMBERS_WORDS } from '../words/members';

export interface MemberLine extends MemberView {
  /** The member's page, for those who may open it. */
  href: string | null;
}

const NAME: DataColumn<MemberLine> = {
  id: 'name',
  header: MEMBERS_WORDS.name,
  value: (row) => row.name,
  cell: (row) => (
    <>
      {row.href ? <TextLink href={row.href}>{row.name}</TextLink> : row.name}
      {row.isYou && <span className="font-normal text-ink-soft"> {MEMBERS_WORDS.you}</span>}
    </>
  ),
};

const REST: DataColumn<MemberLine>[] = [
  { id: 'role', header: MEMBERS_WORDS.role, value: (row) => row.roleWord },
  {
    id: 'joined',
    header: MEMBERS_WORDS.joined,
    value: (row) => row.joinedDay,
    cell: (row) => row.joinedText,
    filterable: false,
  },
  {
    id: 'days',
    header: MEMBERS_WORDS.guestDays,
    value: (row) => row.guestFrom,
    cell: (row) => row.guestText,
    filterable: false,
  },
  { id: 'sponsor', header: MEMBERS_WORDS.sponsor, value: (row) => row.sponsorName },
];

const COLUMNS = [NAME, ...REST];
const WITH_EMAIL: DataColumn<MemberLine>[] = [
  NAME,
  {
    id: 'email',
    header: 'E-mail',
    value: (row) => row.email,
    cell: (row) => <span className="break-all">{row.email}</span>,
  },
  ...REST,
];

export function MembersTable({ rows, withEmail }: { rows: MemberLine[]; withEmail: boolean }) {
  return (
    <DataTable
      caption={MEMBERS_WORDS.caption}
      captionHidden
      rows={rows}
      columns={withEmail ? WITH_EMAIL : COLUMNS}
      rowId={(row) => row.id}
      filterLabel={MEMBERS_WORDS.find}
      initialSort={{ id: 'name' }}
    />
  );
}
