import { StandFormView } from '@/features/ground/components/stand-form';
import { formClubOf } from '@/features/ground/form-club';
import { listHunters } from '@/features/ground/people-data';
import { standFormOf } from '@/features/ground/stand-form';
import { getStand } from '@/features/ground/stands-data';
import { CHANGE_STAND_PAGE_WORDS } from '@/features/ground/words/pages';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { PageTitle } from '@/ui/page-parts';
import { addStandAction, changeStandAction } from '../../actions';

export const metadata = { title: CHANGE_STAND_PAGE_WORDS.title };

export default clubPage('stands.write', async ({ scope, params }) => {
  const stand = await getStand(scope, params.stand ?? '');
  if (!stand) throw notFound();
  return (
    <>
      <PageTitle title={CHANGE_STAND_PAGE_WORDS.heading(stand.name)} over={CHANGE_STAND_PAGE_WORDS.stands} />
      <StandFormView
        key={stand.version}
        club={scope.club.slug}
        formClub={formClubOf(scope.club)}
        restDaysDefault={scope.club.rules.restDaysDefault}
        hunters={await listHunters(scope)}
        values={standFormOf(stand, scope.club.units)}
        at={{ id: stand.id, version: stand.version }}
        add={addStandAction}
        change={changeStandAction}
      />
    </>
  );
});
