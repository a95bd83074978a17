import type { Metadata } from 'next';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { PlainFrame } from './plain-frame';

export const metadata: Metadata = { title: 'Nothing here' };

export default function NotFoundPage() {
  return (
    <PlainFrame>
      <PageTitle title="Nothing here" />
      <EmptyState
        title="There is no such page, or it is not open to you"
        action={<ButtonLink href="/">Go on</ButtonLink>}
      >
        Check the address. If it is a page of your club, you may be signed in with another account, or your role does
        not include it: ask a club admin.
      </EmptyState>
    </PlainFrame>
  );
}
