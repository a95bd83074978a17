'use client';

import { useRouter } from 'next/navigation';
import { lazy, Suspense, useEffect, useState } from 'react';
import { Button } from './button';
import { goKeys, type KeyMeaning, meaningOf } from './go-keys';
import { KeysSign } from './signs';
import { KEYS_BUTTON_WORDS } from './words/shell';

const KeyList = lazy(async () => ({ default: (await import('./key-list')).KeyList }));

const OFF = 'keys-off';
const AFTER_G_MS = 1500;

function readOff(): boolean {
  try {
    return localStorage.getItem(OFF) === '1';
  } catch {
    return false;
  }
}

function keepOff(off: boolean): void {
  try {
    if (off) localStorage.setItem(OFF, '1');
    else localStorage.removeItem(OFF);
  } catch {
    // Private windows may refuse; the choice then lasts as long as the page.
  }
}

function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))
  );
}

function stepRow(by: 1 | -1): void {
  const rows = [...document.querySelectorAll<HTMLElement>('[data-row]')].filter((row) => row.offsetParent !== null);
  const at = rows.findIndex((row) => row.matches(':focus'));
  rows[at === -1 ? (by === 1 ? 0 : rows.length - 1) : at + by]?.focus();
}

function follow(rel: 'prev' | 'next'): void {
  document.querySelector<HTMLElement>(`a[rel="${rel}"]`)?.click();
}

export interface KeyboardMapProps {
  items: readonly { href: string; label: string }[];
}

/** Keys for those who have a keyboard: `?` lists them, and there they can be turned off. */
export function KeyboardMap({ items }: KeyboardMapProps) {
  const router = useRouter();
  const [open, setOpen] = useState(false);
  const [off, setOff] = useState(false);
  const letters = goKeys(items.map((item) => item.label));
  const places = items.flatMap(({ href, label }, i) => (letters[i] ? [{ key: letters[i], label, href }] : []));

  useEffect(() => setOff(readOff()), []);

  useEffect(() => {
    if (off) return;
    let afterG = 0;
    const act = (meaning: KeyMeaning) => {
      if ('go' in meaning) return router.push(meaning.go);
      if (meaning.do === 'list') setOpen(true);
      if (meaning.do === 'earlier') follow('prev');
      if (meaning.do === 'later') follow('next');
      if (meaning.do === 'next_row') stepRow(1);
      if (meaning.do === 'row_before') stepRow(-1);
    };
    const onKey = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented || isTyping(event.target)) return;
      if (document.querySelector('[role="dialog"], [role="menu"], [role="alertdialog"]')) return;
      const known = new Map(places.map(({ key, href }) => [key, href]));
      const meaning = meaningOf(event.key, event.timeStamp - afterG < AFTER_G_MS && afterG > 0, known);
      afterG = 'do' in meaning && meaning.do === 'wait' ? event.timeStamp : 0;
      if ('go' in meaning || (meaning.do !== 'none' && meaning.do !== 'wait')) event.preventDefault();
      act(meaning);
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  });

  return (
    <>
      <Button look="quiet" className="justify-start" aria-haspopup="dialog" onClick={() => setOpen(true)}>
        <KeysSign className="size-5" />
        {KEYS_BUTTON_WORDS.keys}
      </Button>
      {open && (
        <Suspense>
          <KeyList
            places={places}
            off={off}
            onOff={(next) => {
              setOff(next);
              keepOff(next);
            }}
            onClose={() => setOpen(false)}
          />
        </Suspense>
      )}
    </>
  );
}
