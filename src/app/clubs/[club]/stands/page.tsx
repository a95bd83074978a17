import { StandsTable } from '@/features/ground/components/stands-table';
import { readClosures, readStandList } from '@/features/ground/reads';
import { STANDS_PAGE_WORDS } from '@/features/ground/words/pages';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';

export const metadata = { title: STANDS_PAGE_WORDS.title };

export default clubPage('stands.read', async ({ scope }) => {
  const at = now();
  const base = `/clubs/${scope.club.slug}`;
  const [lines, closures] = await Promise.all([readStandList(scope, at), readClosures(scope, at)]);
  const canWrite = scope.can('stands.write');
  const addLink = (
    <ButtonLink href={`${base}/stands/new`} look="primary">
      {STANDS_PAGE_WORDS.add}
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        title={STANDS_PAGE_WORDS.title}
        lead={STANDS_PAGE_WORDS.lead}
        actions={
          <>
            {scope.can('closed_days.write') && (
              <ButtonLink href={`${base}/closures`}>{STANDS_PAGE_WORDS.closedDays}</ButtonLink>
            )}
            {canWrite && lines.length > 0 && addLink}
          </>
        }
      />
      {closures.lines
        .filter((line) => line.standName === null)
        .map((line) => (
          <Notice key={line.id} level="caution" title={STANDS_PAGE_WORDS.allClosed} className="mb-4">
            {line.days}: {line.reason}.
          </Notice>
        ))}
      <StandsTable
        club={scope.club.slug}
        lines={lines}
        empty={
          <EmptyState title={STANDS_PAGE_WORDS.none} action={canWrite && addLink}>
            {canWrite ? STANDS_PAGE_WORDS.noneText : STANDS_PAGE_WORDS.noneTextAsk}
          </EmptyState>
        }
      />
    </>
  );
});
