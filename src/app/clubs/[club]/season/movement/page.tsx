import { MONTH_NAMES } from '@/features/coverage/words';
import { readMovement } from '@/features/movement/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink, TextLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';

export const metadata = { title: 'Lines of movement' };

export default clubPage('features.read', async ({ scope }) => {
  const { slug, name } = scope.club;
  const { lines, month } = await readMovement(scope, now());
  const ground = `/clubs/${slug}/ground`;
  return (
    <>
      <PageTitle
        over={name}
        title="Lines of movement"
        lead={`What lies along each line deer travel in ${MONTH_NAMES[month - 1]}, who can sit on each leg, and where nobody can. Practice, from what is drawn on the ground.`}
      />
      {lines.length === 0 && (
        <EmptyState
          title="No travel line this month"
          action={<ButtonLink href={ground}>Draw one on the ground</ButtonLink>}
        >
          A travel line joins bedding to food by way of crossings, scrapes and water.
        </EmptyState>
      )}
      {lines.map((line) => (
        <Section
          key={line.id}
          title={line.name}
          note={`${line.length}. ${line.way ?? 'It joins no bed to no food that is drawn: the deer’s way is not known.'}`}
          actions={<TextLink href={`${ground}?select=${line.id}`}>Show on the ground</TextLink>}
        >
          {line.legs.length > 0 && (
            <Table caption={`Legs of ${line.name}`} captionHidden>
              <THead>
                <Th>Leg</Th>
                <Th align="right">Length</Th>
                <Th>Stands on it</Th>
              </THead>
              <TBody>
                {line.legs.map((leg) => (
                  <Tr key={leg.key}>
                    <RowHead>
                      {leg.from} to {leg.to}
                    </RowHead>
                    <Td label="Length" align="right">
                      {leg.length}
                    </Td>
                    <Td label="Stands on it">
                      {leg.stands.length === 0 ? (
                        <span className="text-ink-soft">No stand</span>
                      ) : (
                        <ul>
                          {leg.stands.map((stand) => (
                            <li key={stand.id}>
                              <TextLink href={`/clubs/${slug}/stands/${stand.id}`}>{stand.name}</TextLink>, {stand.when}
                            </li>
                          ))}
                        </ul>
                      )}
                    </Td>
                  </Tr>
                ))}
              </TBody>
            </Table>
          )}
          {line.gaps.length > 0 && (
            <p className="mt-3 max-w-prose">
              <strong>Nobody reaches</strong> {line.gaps.join('; ')}.
            </p>
          )}
        </Section>
      ))}
    </>
  );
});
