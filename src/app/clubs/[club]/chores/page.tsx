import { dayOf } from '@/core/day-time';
import { ChoreList } from '@/features/chores/components/chore-list';
import { UpkeepTable } from '@/features/chores/components/upkeep-table';
import { WorkDayList } from '@/features/chores/components/work-day-list';
import { readChores } from '@/features/chores/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { finishChoreAction, joinWorkDayAction, takeChoreAction } from './actions';

export const metadata = { title: 'Chores' };

export default clubPage('chores.read', async ({ scope }) => {
  const { slug, name, zone } = scope.club;
  const at = now();
  const { chores, done, workDays, pastDays, upkeep, hours, yearText } = await readChores(scope, at);
  const mayWrite = scope.can('chores.write');
  const add = mayWrite && <ButtonLink href={`/clubs/${slug}/chores/new`}>Add a chore</ButtonLink>;
  const setDay = mayWrite && <ButtonLink href={`/clubs/${slug}/chores/work-days/new`}>Set a work day</ButtonLink>;
  const lists = { club: slug, mayWrite };
  return (
    <>
      <PageTitle
        over={name}
        title="Chores"
        lead="What the ground and the stands need, who does it, and the hours it has taken."
        actions={
          mayWrite && (
            <>
              {add}
              {setDay}
            </>
          )
        }
      />
      <Section title="To do">
        {chores.length === 0 ? (
          <EmptyState title="Nothing to do" action={add}>
            A chore stands here until somebody marks it done.
          </EmptyState>
        ) : (
          <ChoreList
            {...lists}
            lines={chores}
            today={dayOf(at, zone)}
            take={takeChoreAction}
            finish={finishChoreAction}
          />
        )}
      </Section>
      <Section title="Work days" note="They stand in the calendar feeds too.">
        {workDays.length === 0 ? (
          <EmptyState title="None is set" action={setDay}>
            Members see a work day here, and say whether they come.
          </EmptyState>
        ) : (
          <WorkDayList {...lists} lines={workDays} join={joinWorkDayAction} />
        )}
      </Section>
      <Section
        title="Inspections"
        note="Two years on a main strap is usual practice and no standard: the maker's instructions come first."
      >
        {upkeep.length === 0 ? (
          <EmptyState title="No stands yet">Add stands, and each is listed here with its last look.</EmptyState>
        ) : (
          <UpkeepTable club={slug} lines={upkeep} />
        )}
      </Section>
      <Section title="Hours" note={`Credited for chores and work days ${yearText}.`}>
        <Table caption="Hours by member" captionHidden stack={false} className="max-w-md">
          <THead>
            <Th>Member</Th>
            <Th align="right">Hours</Th>
          </THead>
          <TBody>
            {hours.map((line) => (
              <Tr key={line.name}>
                <RowHead>{line.name}</RowHead>
                <Td label="Hours" align="right">
                  {line.hours}
                </Td>
              </Tr>
            ))}
          </TBody>
        </Table>
      </Section>
      {(done.length > 0 || pastDays.length > 0) && (
        <Section title="Done lately">
          {pastDays.length > 0 && <WorkDayList {...lists} lines={pastDays} join={joinWorkDayAction} />}
          <ul className="divide-y divide-rule">
            {done.map((line) => (
              <li key={line.id} className="py-2">
                {line.title} <span className="text-ink-soft">{line.done}</span>
              </li>
            ))}
          </ul>
        </Section>
      )}
    </>
  );
});
