import { ParkingFormView } from '@/features/ground/components/parking-form';
import { formClubOf } from '@/features/ground/form-club';
import { emptyParkingForm } from '@/features/ground/parking-schema';
import { NEW_PARKING_PAGE_WORDS } from '@/features/ground/words/pages';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addParkingAction, changeParkingAction } from '../../actions';

export const metadata = { title: NEW_PARKING_PAGE_WORDS.title };

export default clubPage('features.write', async ({ scope }) => (
  <>
    <PageTitle title={NEW_PARKING_PAGE_WORDS.title} over={NEW_PARKING_PAGE_WORDS.ground} />
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
