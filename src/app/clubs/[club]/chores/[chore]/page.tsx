import { ChoreFormView } from '@/features/chores/components/chore-form';
import { RemoveButton } from '@/features/chores/components/remove-button';
import { listWorkers, readChoreForm } from '@/features/chores/reads';
import { formClubOf } from '@/features/ground/form-club';
import { listPlaceChoices } from '@/features/logs/visit-places';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { addChoreAction, changeChoreAction, removeChoreAction } from '../actions';

export const metadata = { title: 'Chore' };

export default clubPage('chores.write', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const { line, values } = await readChoreForm(scope, params.chore ?? '', now());
  if (line.done !== null) {
    return (
      <>
        <PageTitle over={name} title={line.title} lead={`Done ${line.done}.`} />
        <ButtonLink href={`/clubs/${slug}/chores`}>Back to the chores</ButtonLink>
      </>
    );
  }
  const { id, version, ...typed } = values;
  return (
    <>
      <PageTitle over={name} title={line.title} />
      <ChoreFormView
        club={slug}
        formClub={formClubOf(scope.club)}
        values={typed}
        people={await listWorkers(scope)}
        places={await listPlaceChoices(scope)}
        at={{ id, version }}
        add={addChoreAction}
        change={changeChoreAction}
      />
      <Section title="Take it out">
        <RemoveButton
          club={slug}
          id={id}
          label="Take out"
          title="Take this chore out?"
          done="The chore is taken out"
          remove={removeChoreAction}
        >
          <p>It is gone from the list. The audit log keeps that it was there.</p>
        </RemoveButton>
      </Section>
    </>
  );
});
