import type { HarvestSummary } from '@/core/harvest/summary';
import { figureText, intervalText } from '@/core/indices';
import { formatWeight, type Units } from '@/core/units';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { AGE_WORDS, SEX_WORDS } from '../harvest-words';

/** Deer by sex and age with mean dressed weights, and the share of does in milk. */
export function WeightsTable({ summary, units }: { summary: HarvestSummary; units: Units }) {
  const { groups, lactation } = summary;
  const share = intervalText(lactation.share, 'percent');
  return (
    <>
      <Table caption="Deer by sex and age" captionHidden>
        <THead>
          <Th>Sex</Th>
          <Th>Age</Th>
          <Th align="right">Deer</Th>
          <Th align="right">Mean dressed weight</Th>
          <Th align="right">Weighed dressed</Th>
        </THead>
        <TBody>
          {groups.map((group) => (
            <Tr key={`${group.sex} ${group.age}`}>
              <RowHead>{SEX_WORDS[group.sex]}</RowHead>
              <Td label="Age">{group.age === null ? 'Not estimated' : AGE_WORDS[group.age]}</Td>
              <Td label="Deer" align="right" className="max-sm:text-left">
                {group.count}
              </Td>
              <Td label="Mean dressed weight" align="right" className="max-sm:text-left">
                {group.dressedKg === null ? '–' : formatWeight(group.dressedKg, units)}
              </Td>
              <Td label="Weighed dressed" align="right" className="max-sm:text-left">
                {group.weighed}
              </Td>
            </Tr>
          ))}
        </TBody>
      </Table>
      <p className="mt-3 text-ink-soft">
        {lactation.looked === 0
          ? 'No grown doe was looked at for milk.'
          : `In milk: ${lactation.yes} of ${lactation.looked} grown does looked at, ${figureText(lactation.share, 'percent')} (95 % interval ${share}).`}
      </p>
    </>
  );
}
