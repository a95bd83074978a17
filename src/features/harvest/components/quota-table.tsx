import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { MemberCount, QuotaLine } from '../reads';
import { MEMBER_COUNT_WORDS, QUOTA_TABLE_WORDS } from '../words/season';

/** The club's quotas, with the reader's own count. */
export function QuotaTable({ quotas }: { quotas: QuotaLine[] }) {
  const words = QUOTA_TABLE_WORDS;
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.quota}</Th>
        <Th align="right">{words.taken}</Th>
        <Th align="right">{words.left}</Th>
        <Th>{words.state}</Th>
      </THead>
      <TBody>
        {quotas.map((quota) => (
          <Tr key={quota.key}>
            <RowHead>{quota.text}</RowHead>
            <Td label={words.taken} align="right" className="max-sm:text-left">
              {words.takenOf(quota.taken, quota.most)}
            </Td>
            <Td label={words.left} align="right" className="max-sm:text-left">
              {quota.left}
            </Td>
            <Td label={words.state}>{quota.met ? <Badge look="clay">{words.met}</Badge> : words.open}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}

export function MemberCounts({ members }: { members: MemberCount[] }) {
  const words = MEMBER_COUNT_WORDS;
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.member}</Th>
        <Th align="right">{words.antlered}</Th>
        <Th align="right">{words.antlerless}</Th>
        <Th align="right">{words.byGuests}</Th>
      </THead>
      <TBody>
        {members.map((member) => (
          <Tr key={member.memberId}>
            <RowHead>{member.name}</RowHead>
            <Td label={words.antlered} align="right" className="max-sm:text-left">
              {member.antlered}
            </Td>
            <Td label={words.antlerless} align="right" className="max-sm:text-left">
              {member.antlerless}
            </Td>
            <Td label={words.byGuests} align="right" className="max-sm:text-left">
              {member.byGuests}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
