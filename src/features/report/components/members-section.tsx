import { fairnessWords } from '@/core/draw/fairness';
import { LEAST_SCORES } from '@/core/report/good-sits';
import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { MembersPart } from '../parts/members';
import { MEMBERS_WORDS, MEMBERS_TABLE_WORDS as words } from '../words/members';
import { PART_TITLES } from '../words/page';
import { CsvLink } from './csv-link';
import type { PartProps } from './part-props';

export function MembersSection({ club, report }: PartProps) {
  const { members } = report;
  const { atLeast, byStand, ofGood, ofSits, sits, judged, neverSat, luck, rows, all } = members;
  return (
    <Section
      id="members"
      title={PART_TITLES.members}
      note={atLeast === null ? MEMBERS_WORDS.byRating(LEAST_SCORES) : MEMBERS_WORDS.byScore(atLeast)}
      actions={rows.length > 0 && <CsvLink club={club} report={report} part="members" title={PART_TITLES.members} />}
    >
      <div className="mb-4 grid max-w-prose gap-2">
        <p className="font-semibold">
          {ofGood === null ? MEMBERS_WORDS.noneGood : MEMBERS_WORDS.fair(fairnessWords(ofGood), ofGood, members.sat)}
        </p>
        {luck && <p>{MEMBERS_WORDS.luck[luck.as](luck.mean, luck.low, luck.high)}</p>}
        <ul className="list-disc pl-5 text-ink-soft text-sm">
          <li>{MEMBERS_WORDS.counted}</li>
          {ofSits !== null && <li>{MEMBERS_WORDS.ofSits(ofSits)}</li>}
          {byStand > 0 && <li>{MEMBERS_WORDS.byStand(byStand)}</li>}
          {judged < sits && <li>{MEMBERS_WORDS.notJudged(sits - judged)}</li>}
          {neverSat > 0 && <li>{MEMBERS_WORDS.never(neverSat)}</li>}
        </ul>
      </div>
      {rows.length > 0 && <MembersTable members={members} />}
      {!all && (
        <p className="mt-3 text-ink-soft text-sm">
          {rows.length === 0 && `${MEMBERS_WORDS.noOwn} `}
          {MEMBERS_WORDS.ownOnly}
        </p>
      )}
    </Section>
  );
}

function MembersTable({ members }: { members: MembersPart }) {
  return (
    <FigureTable caption={words.caption}>
      <THead>
        <Th>{words.member}</Th>
        <Th align="right">{words.sits}</Th>
        <Th align="right">{words.good}</Th>
        <Th align="right">{words.ofOwn}</Th>
        <Th align="right">{words.ofAll}</Th>
      </THead>
      <TBody>
        {members.rows.map((row) => (
          <Tr key={row.memberId}>
            <FigureHead>{row.name}</FigureHead>
            <Td align="right">{row.sits}</Td>
            <Td align="right">{row.good}</Td>
            <Td align="right">{row.judged === 0 ? words.none : words.percent(row.good / row.judged)}</Td>
            <Td align="right">{row.shareOfGood === null ? words.none : words.percent(row.shareOfGood)}</Td>
          </Tr>
        ))}
      </TBody>
    </FigureTable>
  );
}
