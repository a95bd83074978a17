import { TextLink } from '@/ui/button';
import { Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { LineView } from '../reads';
import { TIME_WORDS as T, MOVEMENT_WORDS as W } from '../words';

/** One line: its legs in order with who can sit on each, its gaps, and the deer's way by time of day. */
export function LineSection({ club, line }: { club: string; line: LineView }) {
  return (
    <Section
      title={line.name}
      note={W.lineNote(line.length, line.way)}
      actions={<TextLink href={`/clubs/${club}/ground?select=${line.id}`}>{W.onGround}</TextLink>}
    >
      {line.legs.length > 0 && <LegTable club={club} line={line} />}
      <div className="mt-4 grid gap-x-10 gap-y-3 sm:grid-cols-2">
        <div>
          <p className="font-semibold">{T.title}</p>
          <ul className="list-disc pl-5">
            {line.times.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </div>
        {line.gaps.length > 0 && (
          <div>
            <p className="font-semibold">{W.gapsTitle}</p>
            <ul className="list-disc pl-5">
              {line.gaps.map(({ text }) => (
                <li key={text}>{text}</li>
              ))}
            </ul>
          </div>
        )}
      </div>
    </Section>
  );
}

function LegTable({ club, line }: { club: string; line: LineView }) {
  return (
    <Table caption={W.legs(line.name)} captionHidden>
      <THead>
        <Th>{W.leg}</Th>
        <Th align="right">{W.length}</Th>
        <Th>{W.stands}</Th>
      </THead>
      <TBody>
        {line.legs.map((leg) => (
          <Tr key={leg.key}>
            <RowHead>
              <span className="mr-2 font-normal text-ink-soft">{leg.number}</span>
              {W.fromTo(leg.from, leg.to)}
            </RowHead>
            <Td label={W.length} align="right">
              {leg.length}
            </Td>
            <Td label={W.stands}>
              {leg.stands.length === 0 ? (
                <span className="text-ink-soft">{W.noStand}</span>
              ) : (
                <ul>
                  {leg.stands.map((stand) => (
                    <li key={stand.id}>
                      <TextLink href={`/clubs/${club}/stands/${stand.id}`}>{stand.name}</TextLink>, {stand.when}
                    </li>
                  ))}
                </ul>
              )}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
