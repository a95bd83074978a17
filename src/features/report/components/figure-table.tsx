import type { ReactNode } from 'react';
import { RowHead, Table } from '@/ui/table';

/**
 * Figures are read down a column, so on a phone the table keeps its columns and is moved sideways under the names; on paper it
 * has all the room there is.
 */
export function FigureTable({ caption, children }: { caption: string; children: ReactNode }) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a box that scrolls must be reached by keyboard
    <section aria-label={caption} tabIndex={0} className="overflow-x-auto print:overflow-visible">
      <Table caption={caption} stack={false} className="[&_td]:whitespace-nowrap">
        {children}
      </Table>
    </section>
  );
}

export function FigureHead({ children }: { children: ReactNode }) {
  return <RowHead className="sticky left-0 min-w-28 bg-paper">{children}</RowHead>;
}
