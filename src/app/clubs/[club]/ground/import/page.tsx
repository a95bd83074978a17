import { momentText } from '@/features/clubs/words/audit-text';
import { ImportList } from '@/features/exchange/components/import-list';
import { UploadForm } from '@/features/exchange/components/upload-form';
import { listImports } from '@/features/exchange/imports-data';
import { MOST_BYTES } from '@/features/exchange/read/limits';
import { IMPORT_PAGE_WORDS } from '@/features/exchange/words/import';
import { clubPage } from '@/server/doors';
import { PageTitle, Section } from '@/ui/page-parts';

const words = IMPORT_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('features.write', async ({ scope }) => {
  const lines = await listImports(scope);
  return (
    <>
      <PageTitle title={words.title} over={words.over} lead={words.lead} />
      <UploadForm club={scope.club.slug} mostBytes={MOST_BYTES} />
      {lines.length > 0 && (
        <Section title={words.before}>
          <ImportList
            club={scope.club.slug}
            lines={lines.map((line) => ({ ...line, at: momentText(line.createdAt, scope.club) }))}
          />
        </Section>
      )}
    </>
  );
});
