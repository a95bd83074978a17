import { ImportReview } from '@/features/exchange/components/import-review';
import { UndoImport } from '@/features/exchange/components/undo-import';
import { readImport } from '@/features/exchange/read-import';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { saveImportAction, swapImportAction, undoImportAction } from '../actions';

export const metadata = { title: 'Look over a file' };

const LEADS = {
  read: 'Nothing is added yet. Tick what you want, and say what it is.',
  saved: 'What this file added is on the ground.',
  undone: 'What this file added was taken away again.',
};

export default clubPage('features.write', async ({ scope, params }) => {
  const view = await readImport(scope, params.import ?? '');
  const { slug, units } = scope.club;
  const at = { id: view.id, version: view.version };
  const ground = (
    <ButtonLink look={view.state === 'read' ? 'plain' : 'primary'} href={`/clubs/${slug}/ground`}>
      Go to the ground
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        title={view.fileName}
        over="Bring in a file"
        lead={LEADS[view.state]}
        actions={
          view.state === 'saved' && <UndoImport club={slug} at={at} count={view.made.length} undo={undoImportAction} />
        }
      />
      {view.state === 'read' ? (
        <ImportReview
          key={view.version}
          club={slug}
          units={units}
          view={view}
          save={saveImportAction}
          swap={swapImportAction}
        />
      ) : (
        <EmptyState title={view.made.length === 1 ? 'One thing' : `${view.made.length} things`} action={ground}>
          {view.made
            .slice(0, 30)
            .map(({ name }) => name)
            .join(', ')}
          {view.made.length > 30 && ` and ${view.made.length - 30} more`}
        </EmptyState>
      )}
    </>
  );
});
