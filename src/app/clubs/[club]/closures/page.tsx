import { ClosureFormView } from '@/features/ground/components/closure-form';
import { ClosureList } from '@/features/ground/components/closure-list';
import { readClosures } from '@/features/ground/reads';
import { CLOSURES_PAGE_WORDS } from '@/features/ground/words/pages';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { closeAction, openAgainAction } from './actions';

export const metadata = { title: CLOSURES_PAGE_WORDS.title };

export default clubPage('closed_days.write', async ({ scope, search }) => {
  const { today, lines, stands } = await readClosures(scope, now());
  const closable = scope.can('stands.write') ? stands : [];
  const standId = closable.find(({ id }) => id === search.stand)?.id ?? '';
  return (
    <>
      <PageTitle title={CLOSURES_PAGE_WORDS.title} lead={CLOSURES_PAGE_WORDS.lead} />
      <Section title={CLOSURES_PAGE_WORDS.closeDays}>
        <ClosureFormView
          key={standId}
          club={scope.club.slug}
          today={today}
          stands={closable}
          standId={standId}
          close={closeAction}
        />
      </Section>
      <Section title={CLOSURES_PAGE_WORDS.list}>
        {lines.length === 0 ? (
          <EmptyState title={CLOSURES_PAGE_WORDS.none}>{CLOSURES_PAGE_WORDS.noneText}</EmptyState>
        ) : (
          <ClosureList
            club={scope.club.slug}
            caption={CLOSURES_PAGE_WORDS.caption}
            lines={lines}
            openAgain={openAgainAction}
          />
        )}
      </Section>
    </>
  );
});
