import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { readContactAsk } from '@/features/outings/answer-contact';
import { ContactAnswer } from '@/features/outings/components/contact-answer';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { answerContactAction } from './actions';

export const metadata: Metadata = {
  title: 'Safety contact',
  referrer: 'no-referrer',
  robots: { index: false, follow: false },
};

export default publicPage(async ({ params }) => {
  const secret = params.token ?? '';
  const ask = await readContactAsk(secret, now());
  if (!ask) {
    return (
      <PlainFrame>
        <PageTitle title="This link does not work" />
        <p className="max-w-prose">
          It is older than 14 days, somebody else was asked since, or it is not whole. Open the newest mail again, or
          ask whoever named you to have it sent once more.
        </p>
      </PlainFrame>
    );
  }
  return (
    <PlainFrame>
      <PageTitle title={`${ask.memberName} asks you`} lead={`${ask.contactName}, be their safety contact?`} />
      <div className="mb-5 max-w-prose space-y-3">
        <p>
          When {ask.memberName} signs in at a deer stand, they say by when they will be back. If they have not signed
          out some time after that, and the club's officers have been told, you get one e-mail: where they sat, where
          they parked, their vehicle, and when they were to be back.
        </p>
        <p>You may stop at any time, here or from any such mail.</p>
      </div>
      <ContactAnswer secret={secret} memberName={ask.memberName} answered={ask.answer} action={answerContactAction} />
      <Notice level="caution" title="Windrest is no rescue service" className="mt-8">
        It tells you, and sends nobody. When somebody may be hurt, call the emergency number.
      </Notice>
    </PlainFrame>
  );
});
