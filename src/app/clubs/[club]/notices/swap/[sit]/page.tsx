import { SwapList } from '@/features/notices/components/swap-list';
import { readSwap } from '@/features/notices/read-swap';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { swapSitAction } from './actions';

export const metadata = { title: 'Move a sit' };

export default clubPage('sits.book', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const view = await readSwap(scope, params.sit ?? '', now());
  const mySits = <ButtonLink href={`/clubs/${slug}/my-sits`}>My sits</ButtonLink>;
  if (!view) {
    return (
      <>
        <PageTitle over={name} title="Not your sit" lead="A sit is moved by the member whose it is." />
        {mySits}
      </>
    );
  }
  const { sit } = view;
  return (
    <>
      <PageTitle over={name} title={`Your sit at ${sit.standName}`} lead={`${sit.whenText}, ${sit.timeText}`} />
      {view.now && <DefinitionList items={[{ term: 'By the newest forecast', detail: view.now }]} />}
      <Section
        title="Free and quieter"
        note="Moving keeps day, window, weapon and guests, and is checked like any booking."
      >
        {!view.open ? (
          <EmptyState title="This sit can no longer be moved" action={mySits}>
            It has begun, was cancelled or has lapsed.
          </EmptyState>
        ) : view.choices.length === 0 ? (
          <EmptyState title="No free stand is quieter" action={mySits}>
            Keep the sit, or cancel it and leave the ground to rest.
          </EmptyState>
        ) : (
          <SwapList club={slug} view={view} swap={swapSitAction} />
        )}
      </Section>
      {view.open && view.choices.length > 0 && (
        <p className="mt-4">
          <ButtonLink look="quiet" href={`/clubs/${slug}/my-sits`}>
            Keep or cancel it in my sits
          </ButtonLink>
        </p>
      )}
    </>
  );
});
