import type { ComponentProps, ReactNode } from 'react';
import { joinClasses } from './join-classes';
import { Link } from './link';
import { FallingSign, RisingSign, SortableSign } from './signs';

/** Written out because a stacked table's display values would drop the built-in roles in some browsers. */
const ROLE = {
  table: { role: 'table' },
  rowgroup: { role: 'rowgroup' },
  row: { role: 'row' },
  columnheader: { role: 'columnheader' },
  rowheader: { role: 'rowheader' },
  cell: { role: 'cell' },
};

export interface TableProps {
  /** Says what the table holds; shown unless `captionHidden`. */
  caption: ReactNode;
  captionHidden?: boolean;
  /** Rows become small cards on a phone; give each Td its `label`. Default true. */
  stack?: boolean;
  className?: string;
  children: ReactNode;
}

export function Table({ caption, captionHidden, stack = true, className, children }: TableProps) {
  return (
    <table {...ROLE.table} className={joinClasses('w-full border-collapse', stack && 'stacked-table', className)}>
      <caption className={captionHidden ? 'sr-only' : 'pb-1 text-left text-ink-soft text-sm'}>{caption}</caption>
      {children}
    </table>
  );
}

export function THead({ children }: { children: ReactNode }) {
  return (
    <thead {...ROLE.rowgroup}>
      <tr {...ROLE.row}>{children}</tr>
    </thead>
  );
}

export function TBody({ children }: { children: ReactNode }) {
  return (
    <tbody {...ROLE.rowgroup} className="divide-y divide-rule">
      {children}
    </tbody>
  );
}

export function Tr({ className, ...rest }: ComponentProps<'tr'>) {
  return <tr {...ROLE.row} {...rest} className={joinClasses('align-top', className)} />;
}

export type Sorted = 'ascending' | 'descending' | 'none';

export interface ThProps {
  /** Given for a column that can be sorted. */
  sorted?: Sorted;
  onSort?: () => void;
  /** A sort done by the server: where the heading leads. */
  sortHref?: string;
  align?: 'left' | 'right';
  className?: string;
  children?: ReactNode;
}

const SORT_CLASSES =
  'inline-flex min-h-9 items-center gap-1 rounded-sm font-semibold hover:underline underline-offset-4';

export function Th({ sorted, onSort, sortHref, align = 'left', className, children }: ThProps) {
  const inside = sorted && (
    <>
      {children}
      <SortMark sorted={sorted} />
    </>
  );
  return (
    <th
      {...ROLE.columnheader}
      scope="col"
      aria-sort={sorted && sorted !== 'none' ? sorted : undefined}
      className={joinClasses(
        'sticky top-0 z-10 border-rule-strong border-b bg-paper px-2 py-1.5 align-bottom font-semibold text-sm first:pl-0 last:pr-0',
        align === 'right' ? 'text-right' : 'text-left',
        className,
      )}
    >
      {!sorted && children}
      {sorted && onSort && (
        <button type="button" onClick={onSort} className={SORT_CLASSES}>
          {inside}
        </button>
      )}
      {sorted && !onSort && sortHref && (
        <Link href={sortHref} className={SORT_CLASSES} scroll={false}>
          {inside}
        </Link>
      )}
    </th>
  );
}

function SortMark({ sorted }: { sorted: Sorted }) {
  const Mark = sorted === 'ascending' ? RisingSign : sorted === 'descending' ? FallingSign : SortableSign;
  return <Mark className={joinClasses('size-4', sorted === 'none' && 'text-ink-soft')} />;
}

export interface TdProps extends ComponentProps<'td'> {
  /** Column's name, shown beside the value when rows are stacked. */
  label?: string;
  align?: 'left' | 'right';
}

/** Where there is nothing to say. A card leaves it out: only a column needs the place. */
export const NOTHING = '–';

export function Td({ label, align = 'left', className, ...rest }: TdProps) {
  return (
    <td
      {...ROLE.cell}
      data-label={label}
      data-nothing={rest.children === NOTHING || undefined}
      {...rest}
      className={joinClasses('px-2 py-2 first:pl-0 last:pr-0', align === 'right' && 'text-right', className)}
    />
  );
}

/** The cell that names its row. */
export function RowHead({ className, ...rest }: ComponentProps<'th'>) {
  return (
    <th
      {...ROLE.rowheader}
      scope="row"
      {...rest}
      className={joinClasses('px-2 py-2 text-left font-semibold first:pl-0', className)}
    />
  );
}
