import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { KIND_PHRASES } from '@/features/notices/choices-schema';
import { UnsubscribeButton } from '@/features/notices/components/unsubscribe-button';
import { readNoticeLink } from '@/features/notices/unsubscribe';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { unsubscribeAction } from './actions';

export const metadata: Metadata = {
  title: 'Stop mail',
  referrer: 'no-referrer',
  robots: { index: false, follow: false },
};

export default publicPage(async ({ params }) => {
  const secret = params.token ?? '';
  const link = await readNoticeLink(secret);
  if (!link) {
    return (
      <PlainFrame>
        <PageTitle title="This link does not work" />
        <p className="max-w-prose">
          It is older than a year or not whole. Sign in and open Notices in your club to choose what you are told.
        </p>
      </PlainFrame>
    );
  }
  return (
    <PlainFrame>
      <PageTitle
        over={link.clubName}
        title="Stop this mail?"
        lead={`Mail about ${KIND_PHRASES[link.kind]}. Everything else you chose still comes.`}
      />
      <UnsubscribeButton
        secret={secret}
        phrase={KIND_PHRASES[link.kind]}
        stopped={link.stopped}
        action={unsubscribeAction}
      />
      <p className="mt-6">
        <TextLink href={`/clubs/${link.slug}/notices`}>Choose what you are told</TextLink>
      </p>
    </PlainFrame>
  );
});
