'use client';

import { createContext, lazy, type ReactNode, Suspense, useCallback, useContext, useState } from 'react';

export interface ToastText {
  title: string;
  text?: string;
  /** `caution` is said at once and stays until closed. */
  level?: 'info' | 'caution';
}

export type ShownToast = ToastText & { id: number };

const ToastContext = createContext<((toast: ToastText) => void) | null>(null);

/** Stands in where the pile's script cannot be had: a message about a lost signal must not need one. */
function PlainPile({ toasts }: { toasts: ShownToast[] }) {
  const last = toasts.at(-1);
  return (
    <p role="alert" className="fixed inset-x-4 bottom-20 z-50 border-2 border-clay bg-panel px-4 py-3">
      <strong>{last?.title}</strong> {last?.text}
    </p>
  );
}

/** The pile itself comes with the first message. */
const ToastPile = lazy(() =>
  import('./toast-pile').then(
    (parts) => ({ default: parts.ToastPile }),
    () => ({ default: PlainPile }),
  ),
);

/** `const toast = useToast(); toast({ title: 'Sit booked' })`. */
export function useToast(): (toast: ToastText) => void {
  const show = useContext(ToastContext);
  if (!show) throw new Error('useToast needs <ToastProvider> above it');
  return show;
}

export function ToastProvider({ children }: { children: ReactNode }) {
  const [toasts, setToasts] = useState<ShownToast[]>([]);
  const [used, setUsed] = useState(false);
  const show = useCallback((toast: ToastText) => {
    setUsed(true);
    setToasts((now) => [...now.slice(-2), { ...toast, id: (now.at(-1)?.id ?? 0) + 1 }]);
  }, []);
  const close = useCallback((id: number) => setToasts((now) => now.filter((toast) => toast.id !== id)), []);
  return (
    <ToastContext value={show}>
      {children}
      {used && (
        <Suspense>
          <ToastPile toasts={toasts} onClose={close} />
        </Suspense>
      )}
    </ToastContext>
  );
}
