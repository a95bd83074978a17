import { Badge } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { JobRunLine } from '../read-jobs';
import { JOB_RUNS_WORDS } from '../words/records';

const LOOKS = { done: 'plain', failed: 'clay', running: 'moss', unfinished: 'clay' } as const;

export function JobRuns({ caption, runs }: { caption: string; runs: JobRunLine[] }) {
  return (
    <Table caption={caption}>
      <THead>
        <Th>{JOB_RUNS_WORDS.started}</Th>
        <Th>{JOB_RUNS_WORDS.state}</Th>
        <Th align="right">{JOB_RUNS_WORDS.tries}</Th>
        <Th>{JOB_RUNS_WORDS.itSaid}</Th>
      </THead>
      <TBody>
        {runs.map((run) => (
          <Tr key={run.id}>
            <RowHead className="font-normal! sm:whitespace-nowrap">{run.when}</RowHead>
            <Td label={JOB_RUNS_WORDS.state}>
              <span>
                <Badge look={LOOKS[run.state]}>{run.state}</Badge>
              </span>
            </Td>
            <Td label={JOB_RUNS_WORDS.tries} align="right">
              {run.attempts}
            </Td>
            <Td label={JOB_RUNS_WORDS.itSaid} className="break-words">
              {run.said}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
