import { ParkingFormView } from '@/features/ground/components/parking-form';
import { formClubOf } from '@/features/ground/form-club';
import { emptyParkingForm } from '@/features/ground/parking-schema';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addParkingAction, changeParkingAction } from '../../actions';

export const metadata = { title: 'Add a parking place' };

export default clubPage('features.write', async ({ scope }) => (
  <>
    <PageTitle title="Add a parking place" over="Ground" />
    <ParkingFormView
      club={scope.club.slug}
      formClub={formClubOf(scope.club)}
      values={emptyParkingForm()}
      at={null}
      add={addParkingAction}
      change={changeParkingAction}
    />
  </>
));
