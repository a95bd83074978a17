import { OpenDrawForm } from '@/features/draws/components/open-draw-form';
import { readDrawStands } from '@/features/draws/reads';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { openDrawAction } from '../actions';

export const metadata = { title: 'Open a draw' };

export default clubPage('draws.write', async ({ scope }) => {
  const { slug, name } = scope.club;
  const stands = await readDrawStands(scope);
  return (
    <>
      <PageTitle
        over={name}
        title="Open a draw"
        lead="Members rank the stands until it closes. Then you make the draw, look at it and publish it: all of it is booked, or nothing."
      />
      {stands.length === 0 ? (
        <EmptyState
          title="No stands yet"
          action={<ButtonLink href={`/clubs/${slug}/stands`}>Go to the stands</ButtonLink>}
        >
          A draw needs stands to share out.
        </EmptyState>
      ) : (
        <OpenDrawForm club={slug} stands={stands} open={openDrawAction} />
      )}
    </>
  );
});
