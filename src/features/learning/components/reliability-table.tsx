import type { BrierParts, ReliabilityRow } from '@/core/learning/reliability';
import { DefinitionList } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { BRIER_WORDS, RELIABILITY_WORDS } from '../words';

const words = RELIABILITY_WORDS;

const percent = (share: number | null) => (share === null ? '–' : `${Math.round(share * 100)} %`);

/** What was said against what came, bin by bin. */
export function ReliabilityTable({ rows }: { rows: readonly ReliabilityRow[] }) {
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.quiet}</Th>
        <Th align="right">{words.sits}</Th>
        <Th align="right">{words.said}</Th>
        <Th align="right">{words.clean}</Th>
        <Th align="right">{words.interval}</Th>
      </THead>
      <TBody>
        {rows.map((row) => (
          <Tr key={row.fromQuiet}>
            <RowHead>{words.quietOf(row.fromQuiet, row.toQuiet)}</RowHead>
            <Td label={words.sits} align="right">
              {row.sits}
            </Td>
            <Td label={words.said} align="right">
              {percent(row.predicted)}
            </Td>
            <Td label={words.clean} align="right">
              {row.sits === 0 ? '–' : words.cleanOf(row.clean, percent(row.observed))}
            </Td>
            <Td label={words.interval} align="right">
              {row.interval ? words.intervalOf(percent(row.interval.low), percent(row.interval.high)) : '–'}
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
        { term: BRIER_WORDS.sits, detail: BRIER_WORDS.sitsOf(brier.sits) },
        { term: BRIER_WORDS.score, detail: BRIER_WORDS.scoreOf(three(brier.score)) },
        { term: BRIER_WORDS.reliability, detail: BRIER_WORDS.reliabilityOf(three(brier.reliability)) },
        { term: BRIER_WORDS.resolution, detail: BRIER_WORDS.resolutionOf(three(brier.resolution)) },
        { term: BRIER_WORDS.uncertainty, detail: BRIER_WORDS.uncertaintyOf(three(brier.uncertainty)) },
        { term: BRIER_WORDS.within, detail: BRIER_WORDS.withinOf(three(brier.within)) },
      ]}
    />
  );
}
