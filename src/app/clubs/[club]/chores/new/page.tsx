import { EMPTY_CHORE } from '@/features/chores/chore-schema';
import { ChoreFormView } from '@/features/chores/components/chore-form';
import { listWorkers } from '@/features/chores/reads';
import { CHORE_PAGE_WORDS } from '@/features/chores/words/chores';
import { formClubOf } from '@/features/ground/form-club';
import { listPlaceChoices } from '@/features/logs/visit-places';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addChoreAction, changeChoreAction } from '../actions';

export const metadata = { title: CHORE_PAGE_WORDS.add };

export default clubPage('chores.write', async ({ scope }) => (
  <>
    <PageTitle over={scope.club.name} title={CHORE_PAGE_WORDS.add} />
    <ChoreFormView
      club={scope.club.slug}
      formClub={formClubOf(scope.club)}
      values={EMPTY_CHORE}
      people={await listWorkers(scope)}
      places={await listPlaceChoices(scope)}
      at={null}
      add={addChoreAction}
      change={changeChoreAction}
    />
  </>
));
