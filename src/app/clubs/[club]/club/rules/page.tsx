import type { Metadata } from 'next';
import { describeRules } from '@/features/clubs/rules-words';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';

export const metadata: Metadata = { title: 'Club rules' };

export default clubPage('club.read', async ({ scope }) => {
  const { club } = scope;
  return (
    <>
      <PageTitle
        title="Club rules"
        over={club.name}
        actions={
          scope.can('rules.write') && (
            <ButtonLink href={`/clubs/${club.slug}/club/rules/edit`} look="primary">
              Change the rules
            </ButtonLink>
          )
        }
      />
      <Notice title="State law decides">
        These are the club's own rules, with the source and the day its officers gave. Windrest declares no time and no
        method legal.
      </Notice>
      {describeRules(club.rules, club.units).map(({ title, lines }) => (
        <Section key={title} title={title} heading="margin">
          <DefinitionList items={lines.map(({ label, text }) => ({ term: label, detail: text }))} />
        </Section>
      ))}
    </>
  );
});
