import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PlainFrame } from '@/app/plain-frame';
import { env } from '@/env';
import { listKeptMail } from '@/features/mail/reads';
import { publicPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';

export const metadata: Metadata = { title: 'Kept mail' };

const utc = (at: number) => `${new Date(at).toISOString().slice(0, 19).replace('T', ' ')} UTC`;

export default publicPage(async () => {
  if (!env.devPages) notFound();
  const mails = await listKeptMail();
  return (
    <PlainFrame width="page">
      <PageTitle title="Kept mail" over="For developers" lead="What would have been sent. Nothing left this machine." />
      {mails.length === 0 ? (
        <EmptyState title="No mail yet">Mail stands here within a few seconds of being queued.</EmptyState>
      ) : (
        <Table caption="The newest 200, newest first">
          <THead>
            <Th>Subject</Th>
            <Th>To</Th>
            <Th>Kept at</Th>
          </THead>
          <TBody>
            {mails.map(({ id, subject, toEmail, at }) => (
              <Tr key={id}>
                <RowHead>
                  <TextLink href={`/dev/mail/${id}`}>{subject}</TextLink>
                </RowHead>
                <Td label="To">{toEmail}</Td>
                <Td label="Kept at">{utc(at)}</Td>
              </Tr>
            ))}
          </TBody>
        </Table>
      )}
    </PlainFrame>
  );
});
