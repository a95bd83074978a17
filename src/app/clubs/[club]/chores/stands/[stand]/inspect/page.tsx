import { InspectionFormView } from '@/features/chores/components/inspection-form';
import { readStandUpkeep } from '@/features/chores/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { saveInspectionAction } from '../../../actions';

export const metadata = { title: 'Inspect a stand' };

export default clubPage('inspections.write', async ({ scope, params }) => {
  const { line, form } = await readStandUpkeep(scope, params.stand ?? '', now());
  return (
    <>
      <PageTitle over={scope.club.name} title={`Inspect ${line.name}`} />
      <Notice level="caution" title="Harness on from ground to ground" className="mb-6">
        Look the straps and the tree over from below before you climb. The maker's instructions come before this list.
      </Notice>
      <InspectionFormView club={scope.club.slug} values={form} save={saveInspectionAction} />
    </>
  );
});
