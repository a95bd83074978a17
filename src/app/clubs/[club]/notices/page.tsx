import { findChoices } from '@/features/notices/choices-data';
import { choicesForm } from '@/features/notices/choices-schema';
import { ChoicesFormView } from '@/features/notices/components/choices-form';
import { kindsFor } from '@/features/notices/kinds-for';
import { NOTICES_PAGE_WORDS } from '@/features/notices/words/choices';
import { clubPage } from '@/server/doors';
import { PageTitle, Section } from '@/ui/page-parts';
import { saveChoicesAction } from './actions';

const words = NOTICES_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('notices.own', async ({ scope }) => {
  const { slug, name } = scope.club;
  return (
    <>
      <PageTitle over={name} title={words.title} lead={words.lead(name, scope.member.email)} />
      <ChoicesFormView
        club={slug}
        values={choicesForm(await findChoices(scope, scope.member.id))}
        kinds={kindsFor(scope.member.role)}
        save={saveChoicesAction}
      />
      <Section title={words.always}>
        <p className="max-w-prose">{words.alwaysText}</p>
      </Section>
    </>
  );
});
