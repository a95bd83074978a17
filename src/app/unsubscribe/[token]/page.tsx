import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { UnsubscribeButton } from '@/features/notices/components/unsubscribe-button';
import { readNoticeLink } from '@/features/notices/unsubscribe';
import { KIND_PHRASES, UNSUBSCRIBE_WORDS } from '@/features/notices/words/choices';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';
import { unsubscribeAction } from './actions';

const words = UNSUBSCRIBE_WORDS;

export const metadata: Metadata = {
  title: words.title,
  referrer: 'no-referrer',
  robots: { index: false, follow: false },
};

export default publicPage(async ({ params }) => {
  const secret = params.token ?? '';
  const link = await readNoticeLink(secret);
  if (!link) {
    return (
      <PlainFrame>
        <PageTitle title={words.deadTitle} />
        <p className="max-w-prose">{words.deadText}</p>
      </PlainFrame>
    );
  }
  return (
    <PlainFrame>
      <PageTitle over={link.clubName} title={words.question} lead={words.lead(link.kind)} />
      <UnsubscribeButton
        secret={secret}
        phrase={KIND_PHRASES[link.kind]}
        stopped={link.stopped}
        action={unsubscribeAction}
      />
      <p className="mt-6">
        <TextLink href={`/clubs/${link.slug}/notices`}>{words.choose}</TextLink>
      </p>
    </PlainFrame>
  );
});
