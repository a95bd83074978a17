import { TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ClubLogLine, LogLine } from '../reads';

interface LogLinkProps {
  club: string;
  line: { sitId: string; standName: string; whenText: string; memberName: string };
}

function LogLink({ club, line }: LogLinkProps) {
  return (
    <TextLink href={`/clubs/${club}/log/${line.sitId}`} className="inline-block py-1">
      {line.standName}
      <span className="sr-only">{`, log of ${line.memberName}, ${line.whenText}`}</span>
    </TextLink>
  );
}

/** One's own logs. */
export function LogList({ club, lines }: { club: string; lines: LogLine[] }) {
  return (
    <Table caption="Your logs of the last year, the latest first" captionHidden>
      <THead>
        <Th>Stand</Th>
        <Th>When</Th>
        <Th>Deer</Th>
        <Th>Bumped</Th>
        <Th>Shot</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.sitId}>
            <RowHead>
              <LogLink club={club} line={line} />
            </RowHead>
            <Td label="When">{line.whenText}</Td>
            <Td label="Deer">{line.counts}</Td>
            <Td label="Bumped">{line.bumps || 'None'}</Td>
            <Td label="Shot">
              {line.shot || 'None'} {line.open && <Badge look="clay">Follow-up open</Badge>}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}

/** For officers: who has written a log, and what it says where the club's rule shows it. */
export function ClubLogList({ club, lines }: { club: string; lines: ClubLogLine[] }) {
  return (
    <Table caption="Sits of the club in the last two weeks, the latest first" captionHidden>
      <THead>
        <Th>Stand</Th>
        <Th>When</Th>
        <Th>Member</Th>
        <Th>Log</Th>
        <Th>Deer</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.sitId}>
            <RowHead>{line.mayOpen ? <LogLink club={club} line={line} /> : line.standName}</RowHead>
            <Td label="When">{line.whenText}</Td>
            <Td label="Member">{line.memberName}</Td>
            <Td label="Log">{line.logged ? 'Written' : <Badge look="clay">Missing</Badge>}</Td>
            <Td label="Deer">{line.counts ?? (line.logged ? 'Kept by the club’s rule' : '–')}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
