import { InspectionFormView } from '@/features/chores/components/inspection-form';
import { readStandUpkeep } from '@/features/chores/upkeep-reads';
import { INSPECT_PAGE_WORDS } from '@/features/chores/words/inspections';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { saveInspectionAction } from '../../../actions';

const words = INSPECT_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('inspections.write', async ({ scope, params }) => {
  const { line, form, closedBy } = await readStandUpkeep(scope, params.stand ?? '', now());
  return (
    <>
      <PageTitle over={scope.club.name} title={words.titleOf(line.name)} />
      <Notice level="caution" title={words.harness} className="mb-6">
        {words.harnessText}
      </Notice>
      <InspectionFormView club={scope.club.slug} values={form} closedBy={closedBy} save={saveInspectionAction} />
    </>
  );
});
