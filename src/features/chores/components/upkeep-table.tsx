import type { DueState } from '@/core/upkeep/inspection';
import { TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { UpkeepLine } from '../reads';

const STATE_WORDS: Record<DueState, string | null> = { over: 'Over', soon: 'Soon', fine: null };
const LOOKS = { pass: 'moss', fix_first: 'plain', closed: 'clay' } as const;

function State({ state }: { state: DueState }) {
  const word = STATE_WORDS[state];
  return word && <Badge look={state === 'over' ? 'clay' : 'plain'}>{word}</Badge>;
}

/** Every stand with its last look, the next, and its strap. */
export function UpkeepTable({ club, lines }: { club: string; lines: UpkeepLine[] }) {
  return (
    <Table caption="Inspections and straps, what is due first" captionHidden>
      <THead>
        <Th>Stand</Th>
        <Th>Result</Th>
        <Th>Last look</Th>
        <Th>Next due</Th>
        <Th>Main strap</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.standId}>
            <RowHead>
              <TextLink href={`/clubs/${club}/chores/stands/${line.standId}`}>{line.name}</TextLink>
            </RowHead>
            <Td label="Result">
              <span>{line.result ? <Badge look={LOOKS[line.result]}>{line.resultText}</Badge> : line.resultText}</span>
            </Td>
            <Td label="Last look">{line.lastText}</Td>
            <Td label="Next due">
              <span>
                {line.nextText} <State state={line.nextState} />
              </span>
            </Td>
            <Td label="Main strap">
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
