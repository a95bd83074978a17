import type { ReactNode } from 'react';
import { RowHead, Table } from './table';

/** What is wider than a phone and moves sideways by itself; on paper it has all the room there is. */
export function SidewaysBox({ label, children }: { label: string; children: ReactNode }) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a box that scrolls must be reached by keyboard
    <section aria-label={label} tabIndex={0} className="overflow-x-auto print:overflow-visible">
      {children}
    </section>
  );
}

/** Figures are read down a column, so on a phone the table keeps its columns and is moved sideways under the names. */
export function FigureTable({ caption, children }: { caption: string; children: ReactNode }) {
  return (
    <SidewaysBox label={caption}>
      <Table caption={caption} stack={false} className="[&_td]:whitespace-nowrap">
        {children}
      </Table>
    </SidewaysBox>
  );
}

export function FigureHead({ children }: { children: ReactNode }) {
  return <RowHead className="sticky left-0 min-w-28 bg-paper first-letter:uppercase">{children}</RowHead>;
}
