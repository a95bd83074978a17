'use client';

import { createContext, type ReactNode, Suspense, useContext, useEffect, useState } from 'react';
import { Button } from '@/ui/button';
import { type Closes, makeLazy } from '@/ui/lazy-part';
import { useToast } from '@/ui/toast';
import { LAZY_WORDS } from '@/ui/words/late';
import type { SitsAskText } from '../ask-schema';
import type { BookActions, Hunter } from '../book-actions';
import type { SitsBrief } from '../view-types';
import { BOOK_BUTTON_WORDS } from '../words/rows';
import type { BookDialogProps } from './book-dialog';
import type { SitDetailProps } from './sit-detail';

const lazyBook = makeLazy<BookDialogProps & Closes>(() => import('./book-dialog').then((parts) => parts.BookDialog));
const lazyDetail = makeLazy<SitDetailProps>(() => import('./sit-detail').then((parts) => parts.SitDetail));

interface OpenRowsProps {
  view: SitsBrief;
  ask: SitsAskText;
  /** Row open at first. */
  openStandId: string | null;
  actions: BookActions;
  /** Members an admin may book for; null: only oneself. */
  hunters: Hunter[] | null;
  children: ReactNode;
}

interface Rows {
  view: SitsBrief;
  ask: SitsAskText;
  openId: string | null;
  toggle: (standId: string) => void;
  book: (standId: string) => void;
}

const RowsContext = createContext<Rows | null>(null);

function useRows(): Rows {
  const rows = useContext(RowsContext);
  if (!rows) throw new Error('A row needs <OpenRows> above it');
  return rows;
}

/** Opens and books rows that the server has drawn; what lies behind them comes when it is asked for. */
export function OpenRows({ view, ask, openStandId, actions, hunters, children }: OpenRowsProps) {
  const toast = useToast();
  const [openId, setOpenId] = useState(openStandId);
  const [bookingId, setBookingId] = useState<string | null>(null);
  useEffect(() => {
    if (openStandId) document.getElementById(openStandId)?.scrollIntoView({ block: 'start' });
  }, [openStandId]);
  const after = (load: () => Promise<unknown>, then: () => void) =>
    void load().then(then, () => toast({ ...LAZY_WORDS, level: 'caution' }));
  const rows: Rows = {
    view,
    ask,
    openId,
    toggle: (id) => (openId === id ? setOpenId(null) : after(lazyDetail.load, () => setOpenId(id))),
    book: (id) => after(lazyBook.load, () => setBookingId(id)),
  };
  const booking = view.open.find((row) => row.standId === bookingId);
  return (
    <RowsContext value={rows}>
      {children}
      {booking && (
        <Suspense>
          <lazyBook.Part
            key={booking.standId}
            row={booking}
            view={view}
            actions={actions}
            hunters={hunters}
            onClose={() => setBookingId(null)}
          />
        </Suspense>
      )}
    </RowsContext>
  );
}

/** The name of a stand; the whole row is its button. */
export function RowButton({ standId, children }: { standId: string; children: ReactNode }) {
  const { openId, toggle } = useRows();
  const open = openId === standId;
  return (
    <button
      type="button"
      data-row
      aria-expanded={open}
      aria-controls={`${standId}-more`}
      onClick={() => toggle(standId)}
      {...lazyDetail.ahead}
      className="text-left font-serif text-lg leading-snug after:absolute after:inset-0"
    >
      {children}
      <span aria-hidden="true" className="ml-1.5 inline-block text-ink-soft">
        {open ? '▴' : '▾'}
      </span>
    </button>
  );
}

/** What lies behind a row. `loading`: ruled lines, drawn by the server. */
export function RowPanel({ standId, loading }: { standId: string; loading: ReactNode }) {
  const { view, ask, openId } = useRows();
  const open = openId === standId;
  return (
    <div id={`${standId}-more`} hidden={!open}>
      {open && (
        <Suspense fallback={loading}>
          <lazyDetail.Part view={view} standId={standId} ask={ask} loading={loading} />
        </Suspense>
      )}
    </div>
  );
}

/** `first`: the best row, where nothing is booked yet. */
export function BookButton({ standId, name, first }: { standId: string; name: string; first: boolean }) {
  const { view, book } = useRows();
  return (
    <Button look={first && !view.mine ? 'primary' : 'plain'} onClick={() => book(standId)} {...lazyBook.ahead}>
      {view.mine ? BOOK_BUTTON_WORDS.move : BOOK_BUTTON_WORDS.book}
      <span className="sr-only">
        {view.mine ? BOOK_BUTTON_WORDS.moveWhich(name) : BOOK_BUTTON_WORDS.bookWhich(name)}
      </span>
    </Button>
  );
}
