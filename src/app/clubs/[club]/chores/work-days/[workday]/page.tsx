import { CreditFormView } from '@/features/chores/components/credit-form';
import { RemoveButton } from '@/features/chores/components/remove-button';
import { WorkDayFormView } from '@/features/chores/components/work-day-form';
import { readWorkDay } from '@/features/chores/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { addWorkDayAction, cancelWorkDayAction, changeWorkDayAction, creditWorkDayAction } from '../../actions';

export const metadata = { title: 'Work day' };

export default clubPage('chores.write', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const { line, values, cancelled, started, members } = await readWorkDay(scope, params.workday ?? '', now());
  const { id, sequence, ...typed } = values;
  const title = <PageTitle over={name} title={line.title} lead={`${line.dayText}, ${line.timeText}`} />;
  if (cancelled) {
    return (
      <>
        {title}
        <p className="mb-5">This work day was called off.</p>
        <ButtonLink href={`/clubs/${slug}/chores`}>Back to the chores</ButtonLink>
      </>
    );
  }
  return (
    <>
      {title}
      {started && (
        <Section title="Hours" note="Blank: was not there.">
          <CreditFormView club={slug} id={id} members={members} credit={creditWorkDayAction} />
        </Section>
      )}
      <Section title="Change">
        <WorkDayFormView
          club={slug}
          values={typed}
          at={{ id, sequence }}
          add={addWorkDayAction}
          change={changeWorkDayAction}
        />
      </Section>
      <Section title="Call it off">
        <RemoveButton
          club={slug}
          id={id}
          label="Call it off"
          title="Call this work day off?"
          done="The work day is called off"
          remove={cancelWorkDayAction}
        >
          <p>Calendar feeds show it as cancelled.</p>
        </RemoveButton>
      </Section>
    </>
  );
});
