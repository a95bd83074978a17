import { emptyApproachForm } from '@/features/ground/approach-schema';
import { ApproachFormView } from '@/features/ground/components/approach-form';
import { formClubOf } from '@/features/ground/form-club';
import { readApproachPlaces } from '@/features/ground/reads';
import { NEW_APPROACH_PAGE_WORDS } from '@/features/ground/words/pages';
import { SmallMap } from '@/features/map/components/small-map';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { addApproachAction, changeApproachAction } from '../actions';

export const metadata = { title: NEW_APPROACH_PAGE_WORDS.title };

export default clubPage('approaches.write', async ({ scope, params }) => {
  const standId = params.stand ?? '';
  const places = await readApproachPlaces(scope, standId);
  return (
    <>
      <PageTitle
        title={NEW_APPROACH_PAGE_WORDS.title}
        over={places.stand.name}
        actions={
          <ButtonLink href={`/clubs/${scope.club.slug}/ground?select=${standId}`}>
            {NEW_APPROACH_PAGE_WORDS.draw}
          </ButtonLink>
        }
      />
      <div className="mb-6 max-w-2xl">
        <SmallMap club={scope.club.slug} standId={standId} />
      </div>
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
