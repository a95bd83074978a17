import type { BrierParts, ReliabilityRow } from '@/core/learning/reliability';
import { DefinitionList } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';

const percent = (share: number | null) => (share === null ? '–' : `${Math.round(share * 100)} %`);

/** What was said against what came, bin by bin. */
export function ReliabilityTable({ rows }: { rows: readonly ReliabilityRow[] }) {
  return (
    <Table caption="Predicted quiet against clean sits" captionHidden>
      <THead>
        <Th>Quiet said</Th>
        <Th align="right">Sits</Th>
        <Th align="right">Said, on average</Th>
        <Th align="right">Went clean</Th>
        <Th align="right">95 % interval</Th>
      </THead>
      <TBody>
        {rows.map((row) => (
          <Tr key={row.fromQuiet}>
            <RowHead>
              {row.fromQuiet} to {row.toQuiet}
            </RowHead>
            <Td label="Sits" align="right">
              {row.sits}
            </Td>
            <Td label="Said, on average" align="right">
              {percent(row.predicted)}
            </Td>
            <Td label="Went clean" align="right">
              {row.sits === 0 ? '–' : `${row.clean}, ${percent(row.observed)}`}
            </Td>
            <Td label="95 % interval" align="right">
              {row.interval ? `${percent(row.interval.low)} to ${percent(row.interval.high)}` : '–'}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}

const three = (value: number) => value.toFixed(3).replace(/^-(0\.0+)$/, '$1');

/** The Brier score and what it is made of. */
export function BrierList({ brier }: { brier: BrierParts }) {
  return (
    <DefinitionList
      className="max-w-2xl"
      items={[
        { term: 'Sits with a prediction and a log', detail: brier.sits },
        { term: 'Brier score (0 is perfect; always saying 50 gives 0.250)', detail: three(brier.score) },
        { term: 'Reliability: what was said is off by (less is better)', detail: three(brier.reliability) },
        { term: 'Resolution: it tells sits apart by (more is better)', detail: three(brier.resolution) },
        { term: 'Uncertainty of the outcome itself', detail: three(brier.uncertainty) },
        { term: 'Predictions that differ inside a row add', detail: three(brier.within) },
      ]}
    />
  );
}
