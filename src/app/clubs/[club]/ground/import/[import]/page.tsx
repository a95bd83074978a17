import { ImportReview } from '@/features/exchange/components/import-review';
import { UndoImport } from '@/features/exchange/components/undo-import';
import { readImport } from '@/features/exchange/read-import';
import { REVIEW_PAGE_WORDS } from '@/features/exchange/words/import';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { saveImportAction, swapImportAction, undoImportAction } from '../actions';

const words = REVIEW_PAGE_WORDS;
const MOST_NAMES = 30;

export const metadata = { title: words.title };

export default clubPage('features.write', async ({ scope, params }) => {
  const view = await readImport(scope, params.import ?? '');
  const { slug, units } = scope.club;
  const at = { id: view.id, version: view.version };
  const ground = (
    <ButtonLink look={view.state === 'read' ? 'plain' : 'primary'} href={`/clubs/${slug}/ground`}>
      {words.ground}
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        title={view.fileName}
        over={words.over}
        lead={words.leads[view.state]}
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
        <EmptyState title={words.things(view.made.length)} action={ground}>
          {words.names(
            view.made.slice(0, MOST_NAMES).map(({ name }) => name),
            view.made.length - MOST_NAMES,
          )}
        </EmptyState>
      )}
    </>
  );
});
