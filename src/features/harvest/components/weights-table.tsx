import type { HarvestSummary } from '@/core/harvest/summary';
import { figureText, intervalText } from '@/core/indices';
import { formatWeight, type Units } from '@/core/units';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { AGE_WORDS, SEX_WORDS } from '../words/deer';
import { WEIGHTS_TABLE_WORDS } from '../words/season';

const words = WEIGHTS_TABLE_WORDS;

/** Deer by sex and age with mean dressed weights, and the share of does in milk. */
export function WeightsTable({ summary, units }: { summary: HarvestSummary; units: Units }) {
  const { groups, lactation } = summary;
  const share = intervalText(lactation.share, 'percent');
  return (
    <>
      <Table caption={words.caption} captionHidden>
        <THead>
          <Th>{words.sex}</Th>
          <Th>{words.age}</Th>
          <Th align="right">{words.deer}</Th>
          <Th align="right">{words.dressed}</Th>
          <Th align="right">{words.weighed}</Th>
        </THead>
        <TBody>
          {groups.map((group) => (
            <Tr key={`${group.sex} ${group.age}`}>
              <RowHead>{SEX_WORDS[group.sex]}</RowHead>
              <Td label={words.age}>{group.age === null ? words.notEstimated : AGE_WORDS[group.age]}</Td>
              <Td label={words.deer} align="right" className="max-sm:text-left">
                {group.count}
              </Td>
              <Td label={words.dressed} align="right" className="max-sm:text-left">
                {group.dressedKg === null ? '–' : formatWeight(group.dressedKg, units)}
              </Td>
              <Td label={words.weighed} align="right" className="max-sm:text-left">
                {group.weighed}
              </Td>
            </Tr>
          ))}
        </TBody>
      </Table>
      <p className="mt-3 text-ink-soft">
        {lactation.looked === 0
          ? words.noMilk
          : words.milk(lactation.yes, lactation.looked, figureText(lactation.share, 'percent'), share)}
      </p>
    </>
  );
}
