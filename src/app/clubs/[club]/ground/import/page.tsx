import { momentText } from '@/features/clubs/audit-words';
import { ImportList } from '@/features/exchange/components/import-list';
import { UploadForm } from '@/features/exchange/components/upload-form';
import { listImports } from '@/features/exchange/imports-data';
import { MOST_BYTES } from '@/features/exchange/read/limits';
import { clubPage } from '@/server/doors';
import { PageTitle, Section } from '@/ui/page-parts';

export const metadata = { title: 'Bring in a file' };

export default clubPage('features.write', async ({ scope }) => {
  const lines = await listImports(scope);
  return (
    <>
      <PageTitle
        title="Bring in a file"
        over="Ground"
        lead="From a handheld, a phone or a map program. You look over every row before anything is added."
      />
      <UploadForm club={scope.club.slug} mostBytes={MOST_BYTES} />
      {lines.length > 0 && (
        <Section title="Files read before">
          <ImportList
            club={scope.club.slug}
            lines={lines.map((line) => ({ ...line, at: momentText(line.createdAt, scope.club) }))}
          />
        </Section>
      )}
    </>
  );
});
