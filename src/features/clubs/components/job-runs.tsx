import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { JobRunLine } from '../read-jobs';

const LOOKS = { done: 'plain', failed: 'clay', running: 'moss', unfinished: 'clay' } as const;

export function JobRuns({ caption, runs }: { caption: string; runs: JobRunLine[] }) {
  return (
    <Table caption={caption}>
      <THead>
        <Th>Started</Th>
        <Th>State</Th>
        <Th align="right">Tries</Th>
        <Th>It said</Th>
      </THead>
      <TBody>
        {runs.map((run) => (
          <Tr key={run.id}>
            <RowHead className="font-normal! sm:whitespace-nowrap">{run.when}</RowHead>
            <Td label="State">
              <span>
                <Badge look={LOOKS[run.state]}>{run.state}</Badge>
              </span>
            </Td>
            <Td label="Tries" align="right">
              {run.attempts}
            </Td>
            <Td label="It said" className="break-words">
              {run.said}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
