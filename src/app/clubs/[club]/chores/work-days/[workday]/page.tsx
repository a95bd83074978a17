import { CreditFormView } from '@/features/chores/components/credit-form';
import { RemoveButton } from '@/features/chores/components/remove-button';
import { WorkDayFormView } from '@/features/chores/components/work-day-form';
import { readWorkDay } from '@/features/chores/reads';
import { WORK_DAY_PAGE_WORDS } from '@/features/chores/words/work-days';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { addWorkDayAction, cancelWorkDayAction, changeWorkDayAction, creditWorkDayAction } from '../../actions';

const words = WORK_DAY_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('chores.write', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const { line, values, cancelled, started, members } = await readWorkDay(scope, params.workday ?? '', now());
  const { id, sequence, ...typed } = values;
  const title = <PageTitle over={name} title={line.title} lead={words.lead(line.dayText, line.timeText)} />;
  if (cancelled) {
    return (
      <>
        {title}
        <p className="mb-5">{words.calledOff}</p>
        <ButtonLink href={`/clubs/${slug}/chores`}>{words.back}</ButtonLink>
      </>
    );
  }
  return (
    <>
      {title}
      {started && (
        <Section title={words.hours} note={words.hoursNote}>
          <CreditFormView club={slug} id={id} members={members} credit={creditWorkDayAction} />
        </Section>
      )}
      <Section title={words.change}>
        <WorkDayFormView
          club={slug}
          values={typed}
          at={{ id, sequence }}
          add={addWorkDayAction}
          change={changeWorkDayAction}
        />
      </Section>
      <Section title={words.callOff}>
        <RemoveButton
          club={slug}
          id={id}
          label={words.callOff}
          title={words.callOffQuestion}
          done={words.callOffDone}
          remove={cancelWorkDayAction}
        >
          <p>{words.callOffText}</p>
        </RemoveButton>
      </Section>
    </>
  );
});
