import { WorkDayFormView } from '@/features/chores/components/work-day-form';
import { WORK_DAY_PAGE_WORDS } from '@/features/chores/words/work-days';
import { EMPTY_WORK_DAY } from '@/features/chores/work-day-schema';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addWorkDayAction, changeWorkDayAction } from '../../actions';

export const metadata = { title: WORK_DAY_PAGE_WORDS.setTitle };

export default clubPage('chores.write', async ({ scope }) => (
  <>
    <PageTitle over={scope.club.name} title={WORK_DAY_PAGE_WORDS.setTitle} lead={WORK_DAY_PAGE_WORDS.setLead} />
    <WorkDayFormView
      club={scope.club.slug}
      values={EMPTY_WORK_DAY}
      at={null}
      add={addWorkDayAction}
      change={changeWorkDayAction}
    />
  </>
));
