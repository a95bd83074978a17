import { StandFormView } from '@/features/ground/components/stand-form';
import { formClubOf } from '@/features/ground/form-club';
import { listHunters } from '@/features/ground/people-data';
import { emptyStandForm } from '@/features/ground/stand-form';
import { NEW_STAND_PAGE_WORDS } from '@/features/ground/words/pages';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addStandAction, changeStandAction } from '../actions';

export const metadata = { title: NEW_STAND_PAGE_WORDS.title };

export default clubPage('stands.write', async ({ scope }) => (
  <>
    <PageTitle title={NEW_STAND_PAGE_WORDS.title} over={NEW_STAND_PAGE_WORDS.stands} />
    <StandFormView
      club={scope.club.slug}
      formClub={formClubOf(scope.club)}
      restDaysDefault={scope.club.rules.restDaysDefault}
      hunters={await listHunters(scope)}
      values={emptyStandForm()}
      at={null}
      add={addStandAction}
      change={changeStandAction}
    />
  </>
));
