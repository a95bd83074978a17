import { StandFormView } from '@/features/ground/components/stand-form';
import { formClubOf } from '@/features/ground/form-club';
import { listHunters } from '@/features/ground/people-data';
import { emptyStandForm } from '@/features/ground/stand-form';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addStandAction, changeStandAction } from '../actions';

export const metadata = { title: 'Add a stand' };

export default clubPage('stands.write', async ({ scope }) => (
  <>
    <PageTitle title="Add a stand" over="Stands" />
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
