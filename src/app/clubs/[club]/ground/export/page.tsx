import { ExportForm } from '@/features/exchange/components/export-form';
import { countLayers } from '@/features/exchange/export-ground';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';

export const metadata = { title: 'Take the ground out' };

export default clubPage('ground.export', async ({ scope }) => (
  <>
    <PageTitle title="Take the ground out" over="Ground" lead="As a file for a handheld, a phone or a map program." />
    <ExportForm club={scope.club.slug} counts={await countLayers(scope)} />
  </>
));
