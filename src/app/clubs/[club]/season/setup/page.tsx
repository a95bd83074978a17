import { Suspense } from 'react';
import { Findings } from '@/features/setup/components/findings';
import { SETUP_WORDS as W } from '@/features/setup/words/findings';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink, TextLink } from '@/ui/button';
import { Loading, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { acceptFindingAction, dismissFindingAction, reopenFindingAction } from './actions';

export const metadata = { title: W.title };

export default clubPage('features.read', async ({ scope, search }) => {
  const { slug, name } = scope.club;
  return (
    <>
      <PageTitle
        over={name}
        title={W.title}
        lead={W.lead}
        actions={
          scope.can('features.write') && (
            <ButtonLink href={`/clubs/${slug}/season/setup/settings`}>{W.settings}</ButtonLink>
          )
        }
      />
      <Notice title={W.askFirst} className="mb-6">
        {W.askFirstText}
      </Notice>
      <Suspense fallback={<Loading label={W.weighing} />}>
        <Findings
          scope={scope}
          now={now()}
          search={search}
          accept={acceptFindingAction}
          dismiss={dismissFindingAction}
          reopen={reopenFindingAction}
        />
      </Suspense>
      <p className="mt-8 text-ink-soft text-sm">
        {W.changedOn.before}
        <TextLink href={`/clubs/${slug}/ground`}>{W.changedOn.link}</TextLink>
        {W.changedOn.after}
      </p>
    </>
  );
});
