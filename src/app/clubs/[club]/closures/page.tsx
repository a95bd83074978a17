import { ClosureFormView } from '@/features/ground/components/closure-form';
import { ClosureList } from '@/features/ground/components/closure-list';
import { readClosures } from '@/features/ground/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { EmptyState } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { closeAction, openAgainAction } from './actions';

export const metadata = { title: 'Closed days' };

export default clubPage('closed_days.write', async ({ scope, search }) => {
  const { today, lines, stands } = await readClosures(scope, now());
  const closable = scope.can('stands.write') ? stands : [];
  const standId = closable.find(({ id }) => id === search.stand)?.id ?? '';
  return (
    <>
      <PageTitle
        title="Closed days"
        lead="Nobody can book on closed days. Sits booked before stay until the member or an admin cancels them."
      />
      <Section title="Close days">
        <ClosureFormView
          key={standId}
          club={scope.club.slug}
          today={today}
          stands={closable}
          standId={standId}
          close={closeAction}
        />
      </Section>
      <Section title="Closed now or later">
        {lines.length === 0 ? (
          <EmptyState title="Everything is open">
            What you close above is listed here, and can be opened again.
          </EmptyState>
        ) : (
          <ClosureList
            club={scope.club.slug}
            caption="Closures of today and later"
            lines={lines}
            openAgain={openAgainAction}
          />
        )}
      </Section>
    </>
  );
});
