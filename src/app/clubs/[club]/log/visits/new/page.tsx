import { dayOf, formatClock } from '@/core/day-time';
import { formClubOf } from '@/features/ground/form-club';
import { VisitFormView } from '@/features/logs/components/visit-form';
import { listPlaceChoices } from '@/features/logs/visit-places';
import { emptyVisitForm } from '@/features/logs/visit-schema';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addVisitAction } from '../../actions';

export const metadata = { title: 'Write down a visit' };

export default clubPage('visits.write', async ({ scope }) => {
  const { club } = scope;
  const at = now();
  return (
    <>
      <PageTitle
        over={club.name}
        title="Write down a visit"
        lead="Anything but a sit. It lowers what the list expects of the stands near by, for a few days."
      />
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
