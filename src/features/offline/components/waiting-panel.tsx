'use client';

import { useCallback, useEffect, useState } from 'react';
import { formatClock, formatClock12 } from '@/core/day-time';
import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { useKeptAccount } from '@/ui/offline/account';
import { useOnline } from '@/ui/offline/use-online';
import { useWaiting } from '@/ui/offline/use-waiting';
import { type WaitingItem, waitingStore } from '@/ui/offline/waiting-store';
import { queryClient } from '@/ui/query';
import { useToast } from '@/ui/toast';
import { flushWaiting } from '../flush-waiting';
import type { WaitingActions } from '../send-waiting';
import { WAITING_WORDS as WORDS } from '../words';

/** Between tries while something waits and the device thinks that it has a signal. */
const AGAIN_MS = 20_000;

export interface WaitingPanelProps {
  zone: string;
  units: 'us' | 'metric';
  actions: WaitingActions;
}

let flushing: Promise<void> | null = null;

/** Sends what waits whenever there is a signal; one run at a time in a tab, and the server takes each key once. */
function useFlush(actions: WaitingActions, items: WaitingItem[], online: boolean): string | null {
  const account = useKeptAccount();
  const toast = useToast();
  const [held, setHeld] = useState<string | null>(null);
  const open = items.filter((item) => item.refused === null).length;
  const flush = useCallback(async () => {
    if (account === null || flushing) return;
    flushing = (async () => {
      // Schemas and all come only when something waits.
      const { sendWaiting } = await import('../send-waiting');
      const done = await flushWaiting(waitingStore, account, (item) => sendWaiting(actions, item));
      setHeld(done.held);
      if (done.sent.length === 0) return;
      toast({ title: WORDS.sent, text: WORDS.sentWhat(done.sent.map((item) => item.label)) });
      await queryClient().invalidateQueries();
    })();
    await flushing.catch(() => undefined);
    flushing = null;
  }, [account, actions, toast]);
  useEffect(() => {
    if (!online || open === 0) return;
    void flush();
    const timer = setInterval(() => void flush(), AGAIN_MS);
    return () => clearInterval(timer);
  }, [online, open, flush]);
  return held;
}

function WaitingLine({ item, zone, units }: { item: WaitingItem } & Omit<WaitingPanelProps, 'actions'>) {
  const clock = units === 'us' ? formatClock12(item.at, zone) : formatClock(item.at, zone);
  return (
    <li className="py-2">
      <p>
        <strong className="font-semibold">{item.label}</strong>
        {WORDS.pressedAt(clock)}
      </p>
      {item.refused !== null && (
        <>
          <p>{WORDS.notTaken(item.refused)}</p>
          <Button
            look="quiet"
            aria-label={WORDS.takeOffWhich(item.label)}
            onClick={() => void waitingStore.drop(item.key)}
          >
            {WORDS.takeOff}
          </Button>
        </>
      )}
    </li>
  );
}

/** What was pressed without signal, until it is sent; a refusal stays until it has been read. */
export function WaitingPanel({ zone, units, actions }: WaitingPanelProps) {
  const items = useWaiting();
  const online = useOnline();
  const held = useFlush(actions, items, online);
  if (items.length === 0) return null;
  const refused = items.filter((item) => item.refused !== null);
  const open = items.filter((item) => item.refused === null);
  const line = { zone, units };
  return (
    <div className="mb-6 grid gap-3 print:hidden">
      {open.length > 0 && (
        <Notice level="caution" live title={WORDS.waits}>
          <p>{held ?? (online ? WORDS.beingSent : WORDS.kept)}</p>
          <ul>
            {open.map((item) => (
              <WaitingLine key={item.key} item={item} {...line} />
            ))}
          </ul>
        </Notice>
      )}
      {refused.length > 0 && (
        <Notice level="stop" live title={WORDS.refused}>
          <ul>
            {refused.map((item) => (
              <WaitingLine key={item.key} item={item} {...line} />
            ))}
          </ul>
        </Notice>
      )}
    </div>
  );
}
