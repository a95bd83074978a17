import { dayOf, formatClock } from '@/core/day-time';
import { formClubOf } from '@/features/ground/form-club';
import { VisitFormView } from '@/features/logs/components/visit-form';
import { listPlaceChoices } from '@/features/logs/visit-places';
import { emptyVisitForm } from '@/features/logs/visit-schema';
import { VISIT_PAGE_WORDS } from '@/features/logs/words/visits';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addVisitAction } from '../../actions';

export const metadata = { title: VISIT_PAGE_WORDS.title };

export default clubPage('visits.write', async ({ scope }) => {
  const { club } = scope;
  const at = now();
  return (
    <>
      <PageTitle over={club.name} title={VISIT_PAGE_WORDS.title} lead={VISIT_PAGE_WORDS.lead} />
      <VisitFormView
        club={club.slug}
        formClub={formClubOf(club)}
        values={emptyVisitForm(dayOf(at, club.zone), formatClock(at, club.zone))}
        places={await listPlaceChoices(scope)}
        add={addVisitAction}
      />
    </>
  );
});
