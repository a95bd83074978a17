import { ExportForm } from '@/features/exchange/components/export-form';
import { countLayers } from '@/features/exchange/export-ground';
import { EXPORT_PAGE_WORDS } from '@/features/exchange/words/export';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';

const words = EXPORT_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('ground.export', async ({ scope }) => (
  <>
    <PageTitle title={words.title} over={words.over} lead={words.lead} />
    <ExportForm club={scope.club.slug} counts={await countLayers(scope)} />
  </>
));
