'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button, type ButtonLook } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';

export type SignOutAction = (values: Record<string, never>) => Promise<ActionAnswer<null>>;

const LOST = 'The server could not be reached. You are still signed in: try again.';

export function SignOutButton({ action, look = 'plain' }: { action: SignOutAction; look?: ButtonLook }) {
  const router = useRouter();
  const toast = useToast();
  const [pending, setPending] = useState(false);

  async function leave() {
    setPending(true);
    const answer = await action({}).catch(() => null);
    setPending(false);
    if (!answer) toast({ title: LOST, level: 'caution' });
    else router.push('/sign-in');
  }

  return (
    <Button look={look} onClick={leave} pending={pending} pendingLabel="Signing out…">
      Sign out
    </Button>
  );
}

export function SignOutEverywhereButton({ action }: { action: SignOutAction }) {
  const router = useRouter();
  async function leave() {
    const answer = await action({}).catch(() => null);
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    router.push('/sign-in');
  }
  return (
    <ConfirmDialog
      title="Sign out everywhere?"
      confirmLabel="Sign out everywhere"
      keepLabel="Stay signed in"
      trigger={<Button>Sign out everywhere</Button>}
      onConfirm={leave}
    >
      Every browser with your account, this one too, has to sign in again.
    </ConfirmDialog>
  );
}
