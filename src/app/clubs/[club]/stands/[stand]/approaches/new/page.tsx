import { emptyApproachForm } from '@/features/ground/approach-schema';
import { ApproachFormView } from '@/features/ground/components/approach-form';
import { formClubOf } from '@/features/ground/form-club';
import { readApproachPlaces } from '@/features/ground/reads';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addApproachAction, changeApproachAction } from '../actions';

export const metadata = { title: 'Add an approach' };

export default clubPage('approaches.write', async ({ scope, params }) => {
  const standId = params.stand ?? '';
  const places = await readApproachPlaces(scope, standId);
  return (
    <>
      <PageTitle title="Add an approach" over={places.stand.name} />
      <ApproachFormView
        club={scope.club.slug}
        formClub={formClubOf(scope.club)}
        standId={standId}
        places={places}
        values={emptyApproachForm()}
        at={null}
        add={addApproachAction}
        change={changeApproachAction}
      />
    </>
  );
});
