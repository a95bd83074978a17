'use client';

import type { ReactNode } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import { DRAW_BUTTON_WORDS } from '../words/buttons';

export interface DrawButtonProps<Values> {
  club: string;
  values: Values;
  label: string;
  /** Said for those who hear the page. */
  about?: string;
  title: string;
  done: string;
  look?: 'primary' | 'plain' | 'quiet' | 'danger';
  danger?: boolean;
  act: (club: string, values: Values) => Promise<ActionResult<unknown>>;
  children: ReactNode;
}

/** Asks, does it, and says what came of it; a refusal is shown in the dialog. */
export function DrawButton<Values>(props: DrawButtonProps<Values>) {
  const { club, values, label, about, title, done, look = 'plain', danger, act, children } = props;
  const toast = useToast();
  async function confirm() {
    const answer = await act(club, values).catch(() => null);
    if (!answer) return DRAW_BUTTON_WORDS.lost;
    if (!answer.ok) return answer.error.message;
    toast({ title: done });
  }
  return (
    <ConfirmDialog
      title={title}
      confirmLabel={label}
      danger={danger ?? false}
      trigger={
        <Button look={look}>
          {label}
          {about ? <span className="sr-only"> {about}</span> : null}
        </Button>
      }
      onConfirm={confirm}
    >
      {children}
    </ConfirmDialog>
  );
}
