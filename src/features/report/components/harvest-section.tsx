import { formatDay } from '@/core/day-time';
import { quotaText } from '@/core/harvest/quotas';
import { ButtonLink } from '@/ui/button';
import { Badge, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { HarvestPart } from '../parts/harvest';
import { HARVEST_WORDS as words } from '../words/harvest';
import { PART_TITLES } from '../words/page';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';

interface HarvestSectionProps extends PartProps {
  harvest: HarvestPart;
  maySetQuotas: boolean;
}

export function HarvestSection({ club, report, harvest, maySetQuotas }: HarvestSectionProps) {
  const { antlered, antlerless, quotas } = harvest;
  const { fromDay, toDay } = report.year;
  return (
    <Section
      id="harvest"
      title={PART_TITLES.harvest}
      note={words.note(formatDay(fromDay, true), formatDay(toDay, true))}
      actions={quotas.length > 0 && <CsvLink club={club} report={report} part="harvest" title={PART_TITLES.harvest} />}
    >
      <p className="mb-3">{words.taken(antlered, antlerless, report.period.label)}</p>
      {quotas.length === 0 ? (
        <>
          <p className="mb-3 text-ink-soft">{words.noQuota}</p>
          {maySetQuotas && <ButtonLink href={`/clubs/${club}/club/rules/edit`}>{words.setQuota}</ButtonLink>}
        </>
      ) : (
        <Table caption={words.caption} captionHidden>
          <THead>
            <Th>{words.quota}</Th>
            <Th align="right">{words.count}</Th>
            <Th align="right">{words.left}</Th>
            <Th>{words.state}</Th>
          </THead>
          <TBody>
            {quotas.map(({ quota, taken, left, met, metBy }) => (
              <Tr key={`${quota.per} ${quota.deer}`}>
                <RowHead>
                  {quotaText(quota)}
                  {metBy !== null && (
                    <span className="block font-normal text-ink-soft text-sm">{words.metBy(metBy)}</span>
                  )}
                </RowHead>
                <Td label={words.count} align="right">
                  {words.takenOf(taken, quota.most)}
                </Td>
                <Td label={words.left} align="right">
                  {left}
                </Td>
                <Td label={words.state}>{met ? <Badge look="clay">{words.met}</Badge> : words.open}</Td>
              </Tr>
            ))}
          </TBody>
        </Table>
      )}
    </Section>
  );
}
