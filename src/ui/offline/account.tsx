'use client';

import { createContext, type ReactNode, useContext } from 'react';

const AccountContext = createContext<string | null>(null);

/** The account under which pages and presses are kept on this device; null: nothing is kept. */
export const useKeptAccount = (): string | null => useContext(AccountContext);

/** Names the account to what is inside, and in the page itself: the worker keeps a page under the account it names. */
export function KeptAccount({ account, children }: { account: string; children: ReactNode }) {
  return (
    <AccountContext value={account}>
      <span hidden data-account={account} />
      {children}
    </AccountContext>
  );
}
