import type { Metadata } from 'next';
import { RulesForm } from '@/features/clubs/components/rules-form';
import { rulesToForm } from '@/features/clubs/rules-form';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { saveRulesAction } from './actions';

export const metadata: Metadata = { title: 'Change the rules' };

export default clubPage('rules.write', async ({ scope }) => {
  const { slug, name, rules, units, version } = scope.club;
  return (
    <>
      <PageTitle
        title="Change the rules"
        over={name}
        lead="They hold for every booking from now on. Sits already booked stay. Closed days are set under Closed days."
      />
      <RulesForm club={slug} units={units} rules={rulesToForm(rules, units, version)} action={saveRulesAction} />
    </>
  );
});
