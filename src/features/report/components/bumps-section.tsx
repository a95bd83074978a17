import { figureText, intervalText } from '@/core/indices';
import type { BumpCount } from '@/core/report/bumps';
import { RangeChart } from '@/ui/charts/range-chart';
import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { BumpsPart } from '../parts/bumps';
import { BUMPS_WORDS as words } from '../words/bumps';
import { PART_TITLES } from '../words/page';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';

/** A share and its interval in percent, as the axis counts. */
function percentOf({ share }: BumpCount) {
  return share.known ? { value: share.value * 100, low: share.low * 100, high: share.high * 100 } : null;
}

export function BumpsSection({ club, report }: PartProps) {
  const { bumps } = report;
  if (bumps.all.sits === 0) {
    return (
      <Section id="bumps" title={PART_TITLES.bumps} note={words.note}>
        <p className="text-ink-soft">{words.empty}</p>
      </Section>
    );
  }
  return (
    <Section
      id="bumps"
      title={PART_TITLES.bumps}
      note={`${words.note} ${words.few}`}
      actions={<CsvLink club={club} report={report} part="bumps" title={PART_TITLES.bumps} />}
    >
      <RangeChart
        title={words.chart}
        unit={words.unit}
        rows={bumps.rows.map(({ standId, name, count }) => ({
          key: standId,
          label: name,
          range: percentOf(count),
          text: figureText(count.share, 'percent'),
          note: words.sits(count.sits),
        }))}
        className="mb-6"
      />
      <StandsTable bumps={bumps} />
      <div className="mt-6 grid items-start gap-x-10 gap-y-6 xl:grid-cols-2">
        {bumps.winds.length > 0 && (
          <CountTable
            caption={words.byWind}
            head={words.wind}
            rows={bumps.winds.map(({ wind, count }) => ({ name: wind, count }))}
          />
        )}
        {bumps.inArc.sits + bumps.outOfArc.sits > 0 && (
          <CountTable
            caption={words.byArc}
            head={words.arc}
            rows={[
              { name: words.inArc, count: bumps.inArc },
              { name: words.outOfArc, count: bumps.outOfArc },
            ]}
          />
        )}
      </div>
      {bumps.noWind > 0 && <p className="mt-3 max-w-prose text-ink-soft text-sm">{words.noWind(bumps.noWind)}</p>}
    </Section>
  );
}

/** The cells after the name: how many, and their share with its interval. */
function CountCells({ count }: { count: BumpCount }) {
  return (
    <>
      <Td align="right">{count.sits}</Td>
      <Td align="right">{count.bumped}</Td>
      <Td align="right">{count.sits - count.bumped}</Td>
      <Td align="right">{figureText(count.share, 'percent')}</Td>
      <Td align="right">{intervalText(count.share, 'percent')}</Td>
    </>
  );
}

function CountHeads({ head }: { head: string }) {
  return (
    <>
      <Th>{head}</Th>
      <Th align="right">{words.logged}</Th>
      <Th align="right">{words.bumped}</Th>
      <Th align="right">{words.clean}</Th>
      <Th align="right">{words.share}</Th>
      <Th align="right">{words.interval}</Th>
    </>
  );
}

function CountTable({
  caption,
  head,
  rows,
}: {
  caption: string;
  head: string;
  rows: { name: string; count: BumpCount }[];
}) {
  return (
    <FigureTable caption={caption}>
      <THead>
        <CountHeads head={head} />
      </THead>
      <TBody>
        {rows.map(({ name, count }) => (
          <Tr key={name}>
            <FigureHead>{name}</FigureHead>
            <CountCells count={count} />
          </Tr>
        ))}
      </TBody>
    </FigureTable>
  );
}

function StandsTable({ bumps }: { bumps: BumpsPart }) {
  return (
    <FigureTable caption={words.byStand}>
      <THead>
        <CountHeads head={words.stand} />
        <Th>{words.winds}</Th>
      </THead>
      <TBody>
        {bumps.rows.map(({ standId, name, count, winds }) => (
          <Tr key={standId}>
            <FigureHead>{name}</FigureHead>
            <CountCells count={count} />
            <Td className="min-w-60 whitespace-normal! text-sm">
              {winds.map(({ wind, count: own }) => words.windLine(wind, own.bumped, own.sits)).join(', ')}
            </Td>
          </Tr>
        ))}
      </TBody>
    </FigureTable>
  );
}
