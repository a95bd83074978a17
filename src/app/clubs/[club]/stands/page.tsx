import { StandsTable } from '@/features/ground/components/stands-table';
import { readClosures, readStandList } from '@/features/ground/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';

export const metadata = { title: 'Stands' };

export default clubPage('stands.read', async ({ scope }) => {
  const at = now();
  const base = `/clubs/${scope.club.slug}`;
  const [lines, closures] = await Promise.all([readStandList(scope, at), readClosures(scope, at)]);
  const canWrite = scope.can('stands.write');
  const addLink = (
    <ButtonLink href={`${base}/stands/new`} look="primary">
      Add a stand
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        title="Stands"
        lead="Every place to sit, the winds it is good for and whether it is open."
        actions={
          <>
            {scope.can('closed_days.write') && <ButtonLink href={`${base}/closures`}>Closed days</ButtonLink>}
            {canWrite && lines.length > 0 && addLink}
          </>
        }
      />
      {closures.lines
        .filter((line) => line.standName === null)
        .map((line) => (
          <Notice key={line.id} level="caution" title="The whole ground is closed" className="mb-4">
            {line.days}: {line.reason}.
          </Notice>
        ))}
      <StandsTable
        club={scope.club.slug}
        lines={lines}
        empty={
          <EmptyState title="No stands yet" action={canWrite && addLink}>
            {canWrite
              ? 'Add the first one: its place and its good winds are enough to begin ranking.'
              : 'A steward adds the stands; ask for it.'}
          </EmptyState>
        }
      />
    </>
  );
});
