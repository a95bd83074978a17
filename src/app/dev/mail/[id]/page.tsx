import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PlainFrame } from '@/app/plain-frame';
import { findLinks } from '@/features/mail/find-links';
import { readKeptMail } from '@/features/mail/reads';
import { KEPT_MAIL_WORDS } from '@/features/mail/words';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';

export const metadata: Metadata = { title: KEPT_MAIL_WORDS.title };

const PRE = 'whitespace-pre-wrap break-words border border-rule bg-panel p-4';

/** A plain link: what it opens is no page of the app. */
function HtmlLink({ id }: { id: string }) {
  return (
    <a href={`/dev/mail/${id}/html`} className="text-moss underline">
      {KEPT_MAIL_WORDS.readHtml}
    </a>
  );
}

export default publicPage(async ({ params }) => {
  const mail = await readKeptMail(params.id ?? '');
  if (!mail) notFound();
  return (
    <PlainFrame width="page" links={<TextLink href="/dev/mail">{KEPT_MAIL_WORDS.all}</TextLink>}>
      <PageTitle title={mail.subject} over={KEPT_MAIL_WORDS.title} />
      <DefinitionList
        items={[
          { term: KEPT_MAIL_WORDS.to, detail: mail.toEmail },
          ...(mail.html ? [{ term: KEPT_MAIL_WORDS.html, detail: <HtmlLink id={mail.id} /> }] : []),
          { term: KEPT_MAIL_WORDS.messageId, detail: <span className="break-all">{mail.messageId}</span> },
        ]}
      />
      <Section title={KEPT_MAIL_WORDS.plain} className="mt-6">
        <p className={PRE}>
          {findLinks(mail.text).map(({ kind, text }, index) =>
            kind === 'link' ? (
              // biome-ignore lint/suspicious/noArrayIndexKey: pieces of one text, drawn whole
              <a key={index} href={text} className="text-moss underline">
                {text}
              </a>
            ) : (
              text
            ),
          )}
        </p>
      </Section>
      {mail.calendar && (
        <Section title={KEPT_MAIL_WORDS.calendar}>
          <pre className={PRE}>{mail.calendar}</pre>
        </Section>
      )}
    </PlainFrame>
  );
});
