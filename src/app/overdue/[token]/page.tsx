import type { Metadata } from 'next';
import { PlainFrame } from '@/app/plain-frame';
import { ContactAnswer } from '@/features/outings/components/contact-answer';
import { readSitLink, type SharedSit } from '@/features/outings/read-sit-link';
import { SIT_LINK_WORDS } from '@/features/outings/words/overdue';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { Notice } from '@/ui/notices';
import { Badge, DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { answerContactAction } from '../../contact/[token]/actions';

const words = SIT_LINK_WORDS;

export const metadata: Metadata = {
  title: words.title,
  referrer: 'no-referrer',
  robots: { index: false, follow: false },
};

function DeadLink() {
  return (
    <>
      <PageTitle title={words.deadTitle} />
      <p className="max-w-prose">{words.deadText}</p>
    </>
  );
}

function Facts({ sit }: { sit: SharedSit }) {
  const { place } = sit;
  const items = [
    ...sit.facts.map(({ label, value }) => ({ term: label, detail: value })),
    ...(place ? [{ term: words.position, detail: `${place.lat.toFixed(5)}, ${place.lon.toFixed(5)}` }] : []),
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
        <p>{words.nothingToDo}</p>
      ) : (
        <>
          {sit.state === 'overdue' && (
            <Notice level="stop" title={words.whatToDo} className="mb-6">
              {words.whatToDoText}
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
      <Notice level="caution" title={words.noRescueTitle} className="mt-8">
        {words.noRescue}
      </Notice>
      {sit.mayStop && (
        <Section title={words.stopTitle} className="mt-8">
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
