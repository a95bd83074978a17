'use client';

import * as RadixToast from 'radix-ui/toast';
import { joinClasses } from './join-classes';
import { CloseSign } from './signs';
import type { ShownToast } from './toast';
import { TOAST_WORDS } from './words/opened';

/** The messages now shown, in a corner that a screen reader follows. */
export function ToastPile({ toasts, onClose }: { toasts: ShownToast[]; onClose: (id: number) => void }) {
  return (
    <RadixToast.Provider label={TOAST_WORDS.message} duration={6000}>
      {toasts.map(({ id, title, text, level = 'info' }) => (
        <RadixToast.Root
          key={id}
          type={level === 'caution' ? 'foreground' : 'background'}
          duration={level === 'caution' ? Number.POSITIVE_INFINITY : undefined}
          onOpenChange={(open) => !open && onClose(id)}
          className={joinClasses(
            'flex items-start gap-3 border-2 bg-panel py-2 pr-1 pl-4',
            level === 'caution' ? 'border-clay' : 'border-moss',
          )}
        >
          <div className="min-w-0 flex-1 py-1.5">
            <RadixToast.Title className="font-semibold">{title}</RadixToast.Title>
            {text && <RadixToast.Description className="text-sm">{text}</RadixToast.Description>}
          </div>
          <RadixToast.Close aria-label={TOAST_WORDS.close} className="inline-flex size-11 items-center justify-center">
            <CloseSign className="size-5" />
          </RadixToast.Close>
        </RadixToast.Root>
      ))}
      <RadixToast.Viewport className="fixed inset-x-4 bottom-20 z-50 flex flex-col gap-2 outline-none sm:inset-x-auto sm:right-6 sm:bottom-6 sm:w-96" />
    </RadixToast.Provider>
  );
}
