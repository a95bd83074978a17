'use client';

import { X } from 'lucide-react';
import * as RadixToast from 'radix-ui/toast';
import { createContext, type ReactNode, useCallback, useContext, useState } from 'react';
import { joinClasses } from './join-classes';

export interface ToastText {
  title: string;
  text?: string;
  /** `caution` is said at once and stays until closed. */
  level?: 'info' | 'caution';
}

const ToastContext = createContext<((toast: ToastText) => void) | null>(null);

/** `const toast = useToast(); toast({ title: 'Sit booked' })`. */
export function useToast(): (toast: ToastText) => void {
  const show = useContext(ToastContext);
  if (!show) throw new Error('useToast needs <ToastProvider> above it');
  return show;
}

export function ToastProvider({ children }: { children: ReactNode }) {
  const [toasts, setToasts] = useState<(ToastText & { id: number })[]>([]);
  const show = useCallback((toast: ToastText) => {
    setToasts((now) => [...now.slice(-2), { ...toast, id: (now.at(-1)?.id ?? 0) + 1 }]);
  }, []);
  return (
    <ToastContext value={show}>
      <RadixToast.Provider label="Message" duration={6000}>
        {children}
        {toasts.map(({ id, title, text, level = 'info' }) => (
          <RadixToast.Root
            key={id}
            type={level === 'caution' ? 'foreground' : 'background'}
            duration={level === 'caution' ? Number.POSITIVE_INFINITY : undefined}
            onOpenChange={(open) => !open && setToasts((now) => now.filter((toast) => toast.id !== id))}
            className={joinClasses(
              'flex items-start gap-3 border-2 bg-panel py-2 pr-1 pl-4',
              level === 'caution' ? 'border-clay' : 'border-moss',
            )}
          >
            <div className="min-w-0 flex-1 py-1.5">
              <RadixToast.Title className="font-semibold">{title}</RadixToast.Title>
              {text && <RadixToast.Description className="text-sm">{text}</RadixToast.Description>}
            </div>
            <RadixToast.Close aria-label="Close message" className="inline-flex size-11 items-center justify-center">
              <X aria-hidden="true" className="size-5" />
            </RadixToast.Close>
          </RadixToast.Root>
        ))}
        <RadixToast.Viewport className="fixed inset-x-4 bottom-20 z-50 flex flex-col gap-2 outline-none sm:inset-x-auto sm:right-6 sm:bottom-6 sm:w-96" />
      </RadixToast.Provider>
    </ToastContext>
  );
}
