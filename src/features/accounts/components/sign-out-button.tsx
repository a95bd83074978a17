'use client';

import { useState } from 'react';
import { Button, type ButtonLook } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { forgetKept } from '@/ui/offline/forget-kept';
import { waitingStore } from '@/ui/offline/waiting-store';
import { useToast } from '@/ui/toast';

export type SignOutAction = (values: Record<string, never>) => Promise<ActionAnswer<null>>;

const LOST = 'The server could not be reached. You are still signed in: try again.';

/** Everything kept on the device goes first; a page loaded anew leaves nothing in the tab's memory. */
async function leaveDevice(): Promise<void> {
  await forgetKept();
  window.location.assign('/sign-in');
}

export function SignOutButton({ action, look = 'plain' }: { action: SignOutAction; look?: ButtonLook }) {
  const [waiting, setWaiting] = useState(0);
  const toast = useToast();
  const [pending, setPending] = useState(false);

  async function leave() {
    setPending(true);
    const answer = await action({}).catch(() => null);
    if (answer) await leaveDevice();
    else toast({ title: LOST, level: 'caution' });
    setPending(false);
  }

  async function ask() {
    const items = await waitingStore.list().catch(() => []);
    if (items.length > 0) setWaiting(items.length);
    else await leave();
  }

  return (
    <>
      <Button look={look} onClick={ask} pending={pending} pendingLabel="Signing out…">
        Sign out
      </Button>
      {waiting > 0 && (
        <ConfirmDialog
          title="Sign out and lose what waits?"
          confirmLabel="Sign out and lose it"
          keepLabel="Stay signed in"
          danger
          open
          onOpenChange={(open) => !open && setWaiting(0)}
          onConfirm={leave}
        >
          {waiting === 1 ? 'One press has' : `${waiting} presses have`} not been sent yet. Open a page of the club where
          there is a signal and it is sent; signing out drops it.
        </ConfirmDialog>
      )}
    </>
  );
}

export function SignOutEverywhereButton({ action }: { action: SignOutAction }) {
  async function leave() {
    const answer = await action({}).catch(() => null);
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    await leaveDevice();
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
