'use client';

import { useCallback, useEffect, useState } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';

/** The tab's own store; null where the browser keeps it shut. */
function tabStore(): Storage | null {
  try {
    return window.sessionStorage;
  } catch {
    return null;
  }
}

function readDraft(key: string): FieldValues | null {
  try {
    const found: unknown = JSON.parse(tabStore()?.getItem(key) ?? 'null');
    return typeof found === 'object' && found !== null ? found : null;
  } catch {
    return null;
  }
}

/**
 * Keeps what is typed in the tab until it is saved, so that going back or a lost page loses nothing. The key names the
 * thing and its version: an old draft never lies over a newer save.
 */
export function useKeptDraft<Values extends FieldValues>(form: UseFormReturn<Values, unknown, Values>, key: string) {
  const [brought, setBrought] = useState(false);
  const name = `draft:${key}`;
  const { reset, getValues, subscribe } = form;

  useEffect(() => {
    const draft = readDraft(name);
    if (draft) {
      reset({ ...getValues(), ...draft }, { keepDefaultValues: true });
      setBrought(true);
    }
    return subscribe({
      formState: { values: true, isDirty: true },
      callback: ({ values, isDirty }) => {
        if (isDirty) tabStore()?.setItem(name, JSON.stringify(values));
        else tabStore()?.removeItem(name);
      },
    });
  }, [name, reset, getValues, subscribe]);

  const drop = useCallback(() => {
    tabStore()?.removeItem(name);
    setBrought(false);
  }, [name]);
  const startAfresh = useCallback(() => {
    reset();
    drop();
  }, [reset, drop]);
  return { brought, drop, startAfresh };
}
