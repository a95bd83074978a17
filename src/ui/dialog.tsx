'use client';

import * as RadixDialog from 'radix-ui/dialog';
import { type ReactNode, useRef } from 'react';
import { joinClasses } from './join-classes';
import { CloseSign } from './signs';
import { DIALOG_WORDS } from './words/opened';

export const VEIL_CLASSES = 'fixed inset-0 z-40 bg-veil';

/** A sheet from the bottom on a phone, a page in the middle where there is room. */
export const SHEET_CLASSES =
  'fixed inset-x-0 bottom-0 z-50 flex max-h-[90dvh] flex-col overflow-y-auto border-rule-strong border-t bg-paper sheet-room p-5 focus:outline-none sm:inset-auto sm:top-1/2 sm:left-1/2 sm:-translate-x-1/2 sm:-translate-y-1/2 sm:border';

export interface DialogProps {
  title: ReactNode;
  description?: ReactNode;
  /** The button that opens it; leave out and give `open` to open it from elsewhere. */
  trigger?: ReactNode;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  className?: string;
  children: ReactNode;
}

/** Without a trigger of its own a dialog would leave focus at the top of the page: it goes back to where it was. */
export function useFocusBack(hasTrigger: boolean) {
  const before = useRef<Element | null>(null);
  return {
    onOpenAutoFocus: () => {
      before.current = document.activeElement;
    },
    onCloseAutoFocus: (event: Event) => {
      if (hasTrigger || !(before.current instanceof HTMLElement)) return;
      event.preventDefault();
      before.current.focus();
    },
  };
}

export function Dialog({ title, description, trigger, open, onOpenChange, className, children }: DialogProps) {
  const focus = useFocusBack(Boolean(trigger));
  return (
    <RadixDialog.Root open={open} onOpenChange={onOpenChange}>
      {trigger && <RadixDialog.Trigger asChild>{trigger}</RadixDialog.Trigger>}
      <RadixDialog.Portal>
        <RadixDialog.Overlay className={VEIL_CLASSES} />
        <RadixDialog.Content
          className={joinClasses(SHEET_CLASSES, className)}
          {...focus}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <div className="double-rule mb-4 flex items-start justify-between gap-4 pb-2">
            <RadixDialog.Title className="font-serif text-xl">{title}</RadixDialog.Title>
            <RadixDialog.Close
              aria-label={DIALOG_WORDS.close}
              className="-mt-2 -mr-2 inline-flex size-11 shrink-0 items-center justify-center rounded-sm hover:bg-sunk"
            >
              <CloseSign className="size-5" />
            </RadixDialog.Close>
          </div>
          {description && (
            <RadixDialog.Description className="mb-4 text-ink-soft">{description}</RadixDialog.Description>
          )}
          {children}
        </RadixDialog.Content>
      </RadixDialog.Portal>
    </RadixDialog.Root>
  );
}

/** Any button inside a Dialog that closes it. */
export function DialogClose({ children }: { children: ReactNode }) {
  return <RadixDialog.Close asChild>{children}</RadixDialog.Close>;
}
