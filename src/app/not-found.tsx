import type { Metadata } from 'next';
import { NOT_FOUND_WORDS } from '@/features/accounts/words/public';
import { ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { PlainFrame } from './plain-frame';

export const metadata: Metadata = { title: NOT_FOUND_WORDS.title };

export default function NotFoundPage() {
  return (
    <PlainFrame>
      <PageTitle title={NOT_FOUND_WORDS.title} />
      <EmptyState title={NOT_FOUND_WORDS.what} action={<ButtonLink href="/">{NOT_FOUND_WORDS.go}</ButtonLink>}>
        {NOT_FOUND_WORDS.why}
      </EmptyState>
    </PlainFrame>
  );
}
