'use client';

import * as AlertDialog from 'radix-ui/alert-dialog';
import { type ReactNode, useState } from 'react';
import { Button } from './button';
import { SHEET_CLASSES, useFocusBack, VEIL_CLASSES } from './dialog';
import { FieldError } from './field';
import { CONFIRM_WORDS } from './words/opened';

export interface ConfirmDialogProps {
  title: ReactNode;
  /** What will happen, said before it does. */
  children?: ReactNode;
  confirmLabel: string;
  keepLabel?: string;
  danger?: boolean;
  trigger?: ReactNode;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  /** Answer with a text to keep the dialog open and show why it failed. */
  // biome-ignore lint/suspicious/noConfusingVoidType: callers may return nothing at all
  onConfirm: () => void | Promise<string | void>;
}

export function ConfirmDialog(props: ConfirmDialogProps) {
  const { title, children, confirmLabel, keepLabel = CONFIRM_WORDS.keep, danger, trigger, onConfirm } = props;
  const [ownOpen, setOwnOpen] = useState(false);
  const [pending, setPending] = useState(false);
  const [error, setError] = useState<string>();
  const open = props.open ?? ownOpen;
  const focus = useFocusBack(Boolean(trigger));

  function setOpen(next: boolean) {
    setError(undefined);
    setOwnOpen(next);
    props.onOpenChange?.(next);
  }

  async function confirm() {
    setPending(true);
    try {
      const problem = await onConfirm();
      if (problem) setError(problem);
      else setOpen(false);
    } finally {
      setPending(false);
    }
  }

  return (
    <AlertDialog.Root open={open} onOpenChange={setOpen}>
      {trigger && <AlertDialog.Trigger asChild>{trigger}</AlertDialog.Trigger>}
      <AlertDialog.Portal>
        <AlertDialog.Overlay className={VEIL_CLASSES} />
        <AlertDialog.Content
          className={SHEET_CLASSES}
          {...focus}
          {...(children ? {} : { 'aria-describedby': undefined })}
        >
          <AlertDialog.Title className="double-rule mb-4 pb-2 font-serif text-xl">{title}</AlertDialog.Title>
          {children && (
            <AlertDialog.Description asChild>
              <div className="max-w-prose">{children}</div>
            </AlertDialog.Description>
          )}
          <div role="alert">
            <FieldError>{error}</FieldError>
          </div>
          <div className="mt-5 flex flex-wrap gap-3">
            <Button
              look={danger ? 'danger' : 'primary'}
              pending={pending}
              pendingLabel={CONFIRM_WORDS.working}
              onClick={confirm}
            >
              {confirmLabel}
            </Button>
            <AlertDialog.Cancel asChild>
              <Button>{keepLabel}</Button>
            </AlertDialog.Cancel>
          </div>
        </AlertDialog.Content>
      </AlertDialog.Portal>
    </AlertDialog.Root>
  );
}
