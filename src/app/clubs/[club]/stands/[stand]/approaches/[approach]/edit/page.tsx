import { approachFormOf } from '@/features/ground/approach-schema';
import { getApproach } from '@/features/ground/approaches-data';
import { ApproachFormView } from '@/features/ground/components/approach-form';
import { formClubOf } from '@/features/ground/form-club';
import { readApproachPlaces } from '@/features/ground/reads';
import { CHANGE_APPROACH_PAGE_WORDS } from '@/features/ground/words/pages';
import { SmallMap } from '@/features/map/components/small-map';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { ButtonLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { addApproachAction, changeApproachAction } from '../../actions';

export const metadata = { title: CHANGE_APPROACH_PAGE_WORDS.title };

export default clubPage('approaches.write', async ({ scope, params }) => {
  const approach = await getApproach(scope, params.approach ?? '');
  if (!approach || approach.standId !== params.stand) throw notFound();
  const places = await readApproachPlaces(scope, approach.standId);
  return (
    <>
      <PageTitle
        title={CHANGE_APPROACH_PAGE_WORDS.heading(approach.name)}
        over={places.stand.name}
        actions={
          <ButtonLink href={`/clubs/${scope.club.slug}/ground?select=${approach.id}`}>
            {CHANGE_APPROACH_PAGE_WORDS.draw}
          </ButtonLink>
        }
      />
      <div className="mb-6 max-w-2xl">
        <SmallMap club={scope.club.slug} standId={approach.standId} approachId={approach.id} />
      </div>
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
