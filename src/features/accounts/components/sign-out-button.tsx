'use client';

import { useState } from 'react';
import { Button, type ButtonLook } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { forgetKept } from '@/ui/offline/forget-kept';
import { waitingStore } from '@/ui/offline/waiting-store';
import { useToast } from '@/ui/toast';
import { SIGN_OUT_WORDS } from '../words/forms';

export type SignOutAction = (values: Record<string, never>) => Promise<ActionAnswer<null>>;

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
    else toast({ title: SIGN_OUT_WORDS.lost, level: 'caution' });
    setPending(false);
  }

  async function ask() {
    const items = await waitingStore.list().catch(() => []);
    if (items.length > 0) setWaiting(items.length);
    else await leave();
  }

  return (
    <>
      <Button look={look} onClick={ask} pending={pending} pendingLabel={SIGN_OUT_WORDS.signingOut}>
        {SIGN_OUT_WORDS.signOut}
      </Button>
      {waiting > 0 && (
        <ConfirmDialog
          title={SIGN_OUT_WORDS.loseTitle}
          confirmLabel={SIGN_OUT_WORDS.lose}
          keepLabel={SIGN_OUT_WORDS.stay}
          danger
          open
          onOpenChange={(open) => !open && setWaiting(0)}
          onConfirm={leave}
        >
          {SIGN_OUT_WORDS.waits(waiting)}
        </ConfirmDialog>
      )}
    </>
  );
}

export function SignOutEverywhereButton({ action }: { action: SignOutAction }) {
  async function leave() {
    const answer = await action({}).catch(() => null);
    if (!answer) return SIGN_OUT_WORDS.lost;
    if (!answer.ok) return answer.error.message;
    await leaveDevice();
  }
  return (
    <ConfirmDialog
      title={SIGN_OUT_WORDS.everywhereTitle}
      confirmLabel={SIGN_OUT_WORDS.everywhere}
      keepLabel={SIGN_OUT_WORDS.stay}
      trigger={<Button>{SIGN_OUT_WORDS.everywhere}</Button>}
      onConfirm={leave}
    >
      {SIGN_OUT_WORDS.everywhereText}
    </ConfirmDialog>
  );
}
