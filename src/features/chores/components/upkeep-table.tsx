import type { DueState } from '@/core/upkeep/inspection';
import { TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { UpkeepLine } from '../upkeep-reads';
import { UPKEEP_TABLE_WORDS } from '../words/inspections';

const words = UPKEEP_TABLE_WORDS;
const STATE_WORDS: Record<DueState, string | null> = { over: words.over, soon: words.soon, fine: null };
const LOOKS = { pass: 'moss', fix_first: 'plain', closed: 'clay' } as const;

function State({ state }: { state: DueState }) {
  const word = STATE_WORDS[state];
  return word && <Badge look={state === 'over' ? 'clay' : 'plain'}>{word}</Badge>;
}

/** Every stand with its last look, the next, and its strap. */
export function UpkeepTable({ club, lines }: { club: string; lines: UpkeepLine[] }) {
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.stand}</Th>
        <Th>{words.result}</Th>
        <Th>{words.last}</Th>
        <Th>{words.next}</Th>
        <Th>{words.strap}</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.standId}>
            <RowHead>
              <TextLink href={`/clubs/${club}/chores/stands/${line.standId}`}>{line.name}</TextLink>
            </RowHead>
            <Td label={words.result}>
              <span>{line.result ? <Badge look={LOOKS[line.result]}>{line.resultText}</Badge> : line.resultText}</span>
            </Td>
            <Td label={words.last}>{line.lastText}</Td>
            <Td label={words.next}>
              <span>
                {line.nextText} <State state={line.nextState} />
              </span>
            </Td>
            <Td label={words.strap}>
              <span>
                {line.strapText} <State state={line.strapState} />
              </span>
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
