import { TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { ClubLogLine, LogLine } from '../reads';
import { LOG_LIST_WORDS } from '../words/screen';

const words = LOG_LIST_WORDS;

interface LogLinkProps {
  club: string;
  line: { sitId: string; standName: string; whenText: string; memberName: string };
}

function LogLink({ club, line }: LogLinkProps) {
  return (
    <TextLink href={`/clubs/${club}/log/${line.sitId}`} className="inline-block py-1">
      {line.standName}
      <span className="sr-only">{words.linkOf(line.memberName, line.whenText)}</span>
    </TextLink>
  );
}

/** One's own logs. */
export function LogList({ club, lines }: { club: string; lines: LogLine[] }) {
  return (
    <Table caption={words.own} captionHidden>
      <THead>
        <Th>{words.stand}</Th>
        <Th>{words.when}</Th>
        <Th>{words.deer}</Th>
        <Th>{words.bumped}</Th>
        <Th>{words.shot}</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.sitId}>
            <RowHead>
              <LogLink club={club} line={line} />
            </RowHead>
            <Td label={words.when}>{line.whenText}</Td>
            <Td label={words.deer}>{line.counts}</Td>
            <Td label={words.bumped}>{line.bumps || words.none}</Td>
            <Td label={words.shot}>
              {line.shot || words.none} {line.open && <Badge look="clay">{words.open}</Badge>}
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
    <Table caption={words.club} captionHidden>
      <THead>
        <Th>{words.stand}</Th>
        <Th>{words.when}</Th>
        <Th>{words.member}</Th>
        <Th>{words.log}</Th>
        <Th>{words.deer}</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.sitId}>
            <RowHead>{line.mayOpen ? <LogLink club={club} line={line} /> : line.standName}</RowHead>
            <Td label={words.when}>{line.whenText}</Td>
            <Td label={words.member}>{line.memberName}</Td>
            <Td label={words.log}>{line.logged ? words.written : <Badge look="clay">{words.missing}</Badge>}</Td>
            <Td label={words.deer}>{line.counts ?? (line.logged ? words.kept : '–')}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
