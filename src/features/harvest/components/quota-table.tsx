import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { MemberCount, QuotaLine } from '../reads';

/** The club's quotas, with the reader's own count. */
export function QuotaTable({ quotas }: { quotas: QuotaLine[] }) {
  return (
    <Table caption="Quotas of the season with the club's and your own count" captionHidden>
      <THead>
        <Th>Quota</Th>
        <Th align="right">Taken</Th>
        <Th align="right">Left</Th>
        <Th>State</Th>
      </THead>
      <TBody>
        {quotas.map((quota) => (
          <Tr key={quota.key}>
            <RowHead>{quota.text}</RowHead>
            <Td label="Taken" align="right" className="max-sm:text-left">
              {quota.taken} of {quota.most}
            </Td>
            <Td label="Left" align="right" className="max-sm:text-left">
              {quota.left}
            </Td>
            <Td label="State">{quota.met ? <Badge look="clay">Met</Badge> : 'Open'}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}

export function MemberCounts({ members }: { members: MemberCount[] }) {
  return (
    <Table caption="Deer on each member's count, guests' deer on their sponsor's" captionHidden>
      <THead>
        <Th>Member</Th>
        <Th align="right">Antlered</Th>
        <Th align="right">Antlerless</Th>
        <Th align="right">Of these by guests</Th>
      </THead>
      <TBody>
        {members.map((member) => (
          <Tr key={member.memberId}>
            <RowHead>{member.name}</RowHead>
            <Td label="Antlered" align="right" className="max-sm:text-left">
              {member.antlered}
            </Td>
            <Td label="Antlerless" align="right" className="max-sm:text-left">
              {member.antlerless}
            </Td>
            <Td label="Of these by guests" align="right" className="max-sm:text-left">
              {member.byGuests}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
