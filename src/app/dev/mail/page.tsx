import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PlainFrame } from '@/app/plain-frame';
import { env } from '@/env';
import { listKeptMail } from '@/features/mail/reads';
import { KEPT_MAIL_WORDS } from '@/features/mail/words';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';

export const metadata: Metadata = { title: KEPT_MAIL_WORDS.title };

const utc = (at: number) => KEPT_MAIL_WORDS.utc(new Date(at).toISOString().slice(0, 19).replace('T', ' '));

export default publicPage(async () => {
  if (!env.devPages) notFound();
  const mails = await listKeptMail();
  return (
    <PlainFrame width="page">
      <PageTitle title={KEPT_MAIL_WORDS.title} over={KEPT_MAIL_WORDS.over} lead={KEPT_MAIL_WORDS.lead} />
      {mails.length === 0 ? (
        <EmptyState title={KEPT_MAIL_WORDS.none}>{KEPT_MAIL_WORDS.noneText}</EmptyState>
      ) : (
        <Table caption={KEPT_MAIL_WORDS.caption}>
          <THead>
            <Th>{KEPT_MAIL_WORDS.subject}</Th>
            <Th>{KEPT_MAIL_WORDS.to}</Th>
            <Th>{KEPT_MAIL_WORDS.keptAt}</Th>
          </THead>
          <TBody>
            {mails.map(({ id, subject, toEmail, at }) => (
              <Tr key={id}>
                <RowHead>
                  <TextLink href={`/dev/mail/${id}`}>{subject}</TextLink>
                </RowHead>
                <Td label={KEPT_MAIL_WORDS.to}>{toEmail}</Td>
                <Td label={KEPT_MAIL_WORDS.keptAt}>{utc(at)}</Td>
              </Tr>
            ))}
          </TBody>
        </Table>
      )}
    </PlainFrame>
  );
});
