import { findChoices } from '@/features/notices/choices-data';
import { choicesForm } from '@/features/notices/choices-schema';
import { ChoicesFormView } from '@/features/notices/components/choices-form';
import { kindsFor } from '@/features/notices/kinds-for';
import { clubPage } from '@/server/doors';
import { PageTitle, Section } from '@/ui/page-parts';
import { saveChoicesAction } from './actions';

export const metadata = { title: 'Notices' };

export default clubPage('notices.own', async ({ scope }) => {
  const { slug, name } = scope.club;
  return (
    <>
      <PageTitle
        over={name}
        title="Notices"
        lead={`What ${name} mails you, and when. It goes to ${scope.member.email}.`}
      />
      <ChoicesFormView
        club={slug}
        values={choicesForm(await findChoices(scope, scope.member.id))}
        kinds={kindsFor(scope.member.role)}
        save={saveChoicesAction}
      />
      <Section title="What always comes">
        <p className="max-w-prose">
          Your own bookings, changes and cancellations, a stand closed under a sit of yours, and everything about being
          overdue. These do not wait for quiet hours.
        </p>
      </Section>
    </>
  );
});
