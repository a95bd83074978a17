import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { readContactAsk } from '@/features/outings/answer-contact';
import { ContactAnswer } from '@/features/outings/components/contact-answer';
import { CONTACT_PAGE_WORDS } from '@/features/outings/words/contact';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { answerContactAction } from './actions';

const words = CONTACT_PAGE_WORDS;

export const metadata: Metadata = {
  title: words.title,
  referrer: 'no-referrer',
  robots: { index: false, follow: false },
};

export default publicPage(async ({ params }) => {
  const secret = params.token ?? '';
  const ask = await readContactAsk(secret, now());
  if (!ask) {
    return (
      <PlainFrame>
        <PageTitle title={words.deadTitle} />
        <p className="max-w-prose">{words.deadText}</p>
      </PlainFrame>
    );
  }
  return (
    <PlainFrame>
      <PageTitle title={words.asks(ask.memberName)} lead={words.lead(ask.contactName)} />
      <div className="mb-5 max-w-prose space-y-3">
        <p>{words.what(ask.memberName)}</p>
        <p>{words.stop}</p>
      </div>
      <ContactAnswer secret={secret} memberName={ask.memberName} answered={ask.answer} action={answerContactAction} />
      <Notice level="caution" title={words.noRescueTitle} className="mt-8">
        {words.noRescue}
      </Notice>
    </PlainFrame>
  );
});
