import { OpenDrawForm } from '@/features/draws/components/open-draw-form';
import { readDrawStands } from '@/features/draws/reads';
import { NEW_DRAW_WORDS as WORDS } from '@/features/draws/words/screens';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { openDrawAction } from '../actions';

export const metadata = { title: WORDS.title };

export default clubPage('draws.write', async ({ scope }) => {
  const { slug, name } = scope.club;
  const stands = await readDrawStands(scope);
  return (
    <>
      <PageTitle over={name} title={WORDS.title} lead={WORDS.lead} />
      {stands.length === 0 ? (
        <EmptyState
          title={WORDS.noStands}
          action={<ButtonLink href={`/clubs/${slug}/stands`}>{WORDS.toStands}</ButtonLink>}
        >
          {WORDS.noStandsText}
        </EmptyState>
      ) : (
        <OpenDrawForm club={slug} stands={stands} open={openDrawAction} />
      )}
    </>
  );
});
