import type { Metadata } from 'next';
import { CLUB_RULES_PAGE_WORDS } from '@/features/clubs/words/pages';
import { describeRules } from '@/features/clubs/words/rules';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';

export const metadata: Metadata = { title: CLUB_RULES_PAGE_WORDS.title };

export default clubPage('club.read', async ({ scope }) => {
  const { club } = scope;
  return (
    <>
      <PageTitle
        title={CLUB_RULES_PAGE_WORDS.title}
        over={club.name}
        actions={
          scope.can('rules.write') && (
            <ButtonLink href={`/clubs/${club.slug}/club/rules/edit`} look="primary">
              {CLUB_RULES_PAGE_WORDS.change}
            </ButtonLink>
          )
        }
      />
      <Notice title={CLUB_RULES_PAGE_WORDS.lawTitle}>{CLUB_RULES_PAGE_WORDS.law}</Notice>
      {describeRules(club.rules, club.units).map(({ title, lines }) => (
        <Section key={title} title={title} heading="margin">
          <DefinitionList items={lines.map(({ label, text }) => ({ term: label, detail: text }))} />
        </Section>
      ))}
    </>
  );
});
