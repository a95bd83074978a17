import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { ContactAnswer } from '@/features/outings/components/contact-answer';
import { readSitLink, type SharedSit } from '@/features/outings/read-sit-link';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { Notice } from '@/ui/notices';
import { Badge, DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { answerContactAction } from '../../contact/[token]/actions';

export const metadata: Metadata = {
  title: 'A sit',
  referrer: 'no-referrer',
  robots: { index: false, follow: false },
};

function DeadLink() {
  return (
    <>
      <PageTitle title="This link does not work" />
      <p className="max-w-prose">
        It has run out, was turned off, or is not whole. Ask whoever sent it for a new one. When somebody is missing,
        call them, then the emergency number.
      </p>
    </>
  );
}

function Facts({ sit }: { sit: SharedSit }) {
  const { place } = sit;
  const items = [
    ...sit.facts.map(({ label, value }) => ({ term: label, detail: value })),
    ...(place ? [{ term: 'Position', detail: `${place.lat.toFixed(5)}, ${place.lon.toFixed(5)}` }] : []),
  ];
  return <DefinitionList items={items} />;
}

export default publicPage(async ({ params }) => {
  const secret = params.token ?? '';
  const sit = await readSitLink(secret, now());
  if (!sit) {
    return (
      <PlainFrame>
        <DeadLink />
      </PlainFrame>
    );
  }
  return (
    <PlainFrame>
      <PageTitle
        over={sit.clubName}
        title={sit.memberName}
        lead={<Badge look={sit.state === 'overdue' ? 'clay' : 'strong'}>{sit.stateText}</Badge>}
      />
      {sit.state === 'out' ? (
        <p>Nothing more is to be done.</p>
      ) : (
        <>
          {sit.state === 'overdue' && (
            <Notice level="stop" title="What to do" className="mb-6">
              Call them first: most often a sign-out was forgotten. Then ask the club, or look for the vehicle where it
              was parked. When they may be hurt, call the emergency number and read out what stands here.
            </Notice>
          )}
          <Facts sit={sit} />
          {sit.told.map((line) => (
            <p key={line} className="mt-3 text-ink-soft">
              {line}
            </p>
          ))}
        </>
      )}
      <Notice level="caution" title="Windrest is no rescue service" className="mt-8">
        This page says what was written on the club's board, and sends nobody. Open it again to see what is new.
      </Notice>
      {sit.mayStop && (
        <Section title="Not for you any more?" className="mt-8">
          <ContactAnswer
            secret={secret}
            memberName={sit.memberName}
            answered="yes"
            action={answerContactAction}
            onlyStop
          />
        </Section>
      )}
    </PlainFrame>
  );
});
