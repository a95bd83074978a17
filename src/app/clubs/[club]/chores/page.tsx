import { dayOf } from '@/core/day-time';
import { ChoreList } from '@/features/chores/components/chore-list';
import { UpkeepTable } from '@/features/chores/components/upkeep-table';
import { WorkDayList } from '@/features/chores/components/work-day-list';
import { readChores } from '@/features/chores/reads';
import { CHORES_PAGE_WORDS } from '@/features/chores/words/chores';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { finishChoreAction, joinWorkDayAction, takeChoreAction } from './actions';

const words = CHORES_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('chores.read', async ({ scope }) => {
  const { slug, name, zone } = scope.club;
  const at = now();
  const { chores, done, workDays, pastDays, upkeep, hours, since } = await readChores(scope, at);
  const mayWrite = scope.can('chores.write');
  const add = mayWrite && <ButtonLink href={`/clubs/${slug}/chores/new`}>{words.add}</ButtonLink>;
  const setDay = mayWrite && <ButtonLink href={`/clubs/${slug}/chores/work-days/new`}>{words.setDay}</ButtonLink>;
  const lists = { club: slug, mayWrite };
  return (
    <>
      <PageTitle
        over={name}
        title={words.title}
        lead={words.lead}
        actions={
          mayWrite && (
            <>
              {add}
              {setDay}
            </>
          )
        }
      />
      <Section title={words.toDo}>
        {chores.length === 0 ? (
          <EmptyState title={words.nothing} action={add}>
            {words.nothingText}
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
      <Section title={words.workDays} note={words.workDaysNote}>
        {workDays.length === 0 ? (
          <EmptyState title={words.noWorkDay} action={setDay}>
            {words.noWorkDayText}
          </EmptyState>
        ) : (
          <WorkDayList {...lists} lines={workDays} join={joinWorkDayAction} />
        )}
      </Section>
      <Section title={words.inspections} note={words.inspectionsNote}>
        {upkeep.length === 0 ? (
          <EmptyState title={words.noStand}>{words.noStandText}</EmptyState>
        ) : (
          <UpkeepTable club={slug} lines={upkeep} />
        )}
      </Section>
      <Section title={words.hours} note={words.hoursNote(since)}>
        <Table caption={words.hoursCaption} captionHidden stack={false} className="max-w-md">
          <THead>
            <Th>{words.member}</Th>
            <Th align="right">{words.hours}</Th>
          </THead>
          <TBody>
            {hours.map((line) => (
              <Tr key={line.name}>
                <RowHead>{line.name}</RowHead>
                <Td label={words.hours} align="right">
                  {line.hours}
                </Td>
              </Tr>
            ))}
          </TBody>
        </Table>
      </Section>
      {(done.length > 0 || pastDays.length > 0) && (
        <Section title={words.doneLately}>
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
