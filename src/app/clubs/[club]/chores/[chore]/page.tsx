import { ChoreFormView } from '@/features/chores/components/chore-form';
import { RemoveButton } from '@/features/chores/components/remove-button';
import { listWorkers, readChoreForm } from '@/features/chores/reads';
import { CHORE_PAGE_WORDS } from '@/features/chores/words/chores';
import { formClubOf } from '@/features/ground/form-club';
import { listPlaceChoices } from '@/features/logs/visit-places';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { addChoreAction, changeChoreAction, removeChoreAction } from '../actions';

const words = CHORE_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('chores.write', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const { line, values } = await readChoreForm(scope, params.chore ?? '', now());
  if (line.done !== null) {
    return (
      <>
        <PageTitle over={name} title={line.title} lead={words.done(line.done)} />
        <ButtonLink href={`/clubs/${slug}/chores`}>{words.back}</ButtonLink>
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
      <Section title={words.takeOutTitle}>
        <RemoveButton
          club={slug}
          id={id}
          label={words.takeOut}
          title={words.takeOutQuestion}
          done={words.takenOut}
          remove={removeChoreAction}
        >
          <p>{words.takeOutText}</p>
        </RemoveButton>
      </Section>
    </>
  );
});
