import type { Metadata } from 'next';
import { RulesForm } from '@/features/clubs/components/rules-form';
import { rulesToForm } from '@/features/clubs/rules-form';
import { CLUB_RULES_EDIT_PAGE_WORDS } from '@/features/clubs/words/pages';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { saveRulesAction } from './actions';

export const metadata: Metadata = { title: CLUB_RULES_EDIT_PAGE_WORDS.title };

export default clubPage('rules.write', async ({ scope }) => {
  const { slug, name, rules, units, version } = scope.club;
  return (
    <>
      <PageTitle title={CLUB_RULES_EDIT_PAGE_WORDS.title} over={name} lead={CLUB_RULES_EDIT_PAGE_WORDS.lead} />
      <RulesForm club={slug} units={units} rules={rulesToForm(rules, units, version)} action={saveRulesAction} />
    </>
  );
});
