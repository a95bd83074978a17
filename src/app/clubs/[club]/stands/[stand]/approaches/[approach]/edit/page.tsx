import { approachFormOf } from '@/features/ground/approach-schema';
import { getApproach } from '@/features/ground/approaches-data';
import { ApproachFormView } from '@/features/ground/components/approach-form';
import { formClubOf } from '@/features/ground/form-club';
import { readApproachPlaces } from '@/features/ground/reads';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { PageTitle } from '@/ui/page-parts';
import { addApproachAction, changeApproachAction } from '../../actions';

export const metadata = { title: 'Edit an approach' };

export default clubPage('approaches.write', async ({ scope, params }) => {
  const approach = await getApproach(scope, params.approach ?? '');
  if (!approach || approach.standId !== params.stand) throw notFound();
  const places = await readApproachPlaces(scope, approach.standId);
  return (
    <>
      <PageTitle title={`Edit ${approach.name}`} over={places.stand.name} />
      <ApproachFormView
        key={approach.version}
        club={scope.club.slug}
        formClub={formClubOf(scope.club)}
        standId={approach.standId}
        places={places}
        values={approachFormOf(approach)}
        at={{ id: approach.id, version: approach.version }}
        add={addApproachAction}
        change={changeApproachAction}
      />
    </>
  );
});
