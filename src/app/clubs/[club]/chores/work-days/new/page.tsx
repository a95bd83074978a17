import { WorkDayFormView } from '@/features/chores/components/work-day-form';
import { EMPTY_WORK_DAY } from '@/features/chores/work-day-schema';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addWorkDayAction, changeWorkDayAction } from '../../actions';

export const metadata = { title: 'Set a work day' };

export default clubPage('chores.write', async ({ scope }) => (
  <>
    <PageTitle
      over={scope.club.name}
      title="Set a work day"
      lead="It appears on the Chores page and in every member's calendar feed."
    />
    <WorkDayFormView
      club={scope.club.slug}
      values={EMPTY_WORK_DAY}
      at={null}
      add={addWorkDayAction}
      change={changeWorkDayAction}
    />
  </>
));
