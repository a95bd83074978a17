import { SwapList } from '@/features/notices/components/swap-list';
import { readSwap } from '@/features/notices/read-swap';
import { SWAP_PAGE_WORDS } from '@/features/notices/words/swap';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { swapSitAction } from './actions';

const words = SWAP_PAGE_WORDS;

export const metadata = { title: words.title };

export default clubPage('sits.book', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const view = await readSwap(scope, params.sit ?? '', now());
  const mySits = <ButtonLink href={`/clubs/${slug}/my-sits`}>{words.mySits}</ButtonLink>;
  if (!view) {
    return (
      <>
        <PageTitle over={name} title={words.notYours} lead={words.notYoursText} />
        {mySits}
      </>
    );
  }
  const { sit } = view;
  return (
    <>
      <PageTitle over={name} title={words.titleOf(sit.standName)} lead={words.lead(sit.whenText, sit.timeText)} />
      {view.now && <DefinitionList items={[{ term: words.now, detail: view.now }]} />}
      {view.quotas.map((text) => (
        <Notice key={text} level="caution" title={text} className="mt-4" />
      ))}
      <Section title={words.free} note={words.freeNote}>
        {!view.open ? (
          <EmptyState title={words.over} action={mySits}>
            {words.overText}
          </EmptyState>
        ) : view.choices.length === 0 ? (
          <EmptyState title={words.none} action={mySits}>
            {words.noneText}
          </EmptyState>
        ) : (
          <SwapList club={slug} view={view} swap={swapSitAction} />
        )}
      </Section>
      {view.open && view.choices.length > 0 && (
        <p className="mt-4">
          <ButtonLink look="quiet" href={`/clubs/${slug}/my-sits`}>
            {words.keep}
          </ButtonLink>
        </p>
      )}
    </>
  );
});
