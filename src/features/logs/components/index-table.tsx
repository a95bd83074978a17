import { type Figure, figureText, type Indices, intervalText } from '@/core/indices';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { IndexGroup } from '../sightings-reads';

interface Column {
  head: string;
  of: (indices: Indices) => Figure;
  as?: 'number' | 'percent';
}

const COLUMNS: Column[] = [
  { head: 'Deer/h', of: ({ perHour }) => perHour.all },
  { head: 'Bucks/h', of: ({ perHour }) => perHour.bucks },
  { head: 'Does/h', of: ({ perHour }) => perHour.does },
  { head: 'Fawns/h', of: ({ perHour }) => perHour.fawns },
  { head: 'Does per buck', of: ({ doesPerBuck }) => doesPerBuck },
  { head: 'Fawns per doe', of: ({ fawnsPerDoe }) => fawnsPerDoe },
  { head: 'Unknown', of: ({ unknownShare }) => unknownShare, as: 'percent' },
];

function FigureCell({ figure, as, label }: { figure: Figure; as: 'number' | 'percent'; label: string }) {
  return (
    <Td label={label} align="right" className="max-sm:text-left">
      <span className={figure.known ? 'whitespace-nowrap' : 'text-ink-soft text-sm'}>{figureText(figure, as)}</span>
      {figure.known && (
        <span className="ml-2 whitespace-nowrap text-ink-soft text-xs sm:ml-0 sm:block">
          {intervalText(figure, as)}
        </span>
      )}
    </Td>
  );
}

interface IndexTableProps {
  caption: string;
  head: string;
  groups: IndexGroup[];
}

/** The indices of some groups of sits; the 95 % interval stands small beside each. */
export function IndexTable({ caption, head, groups }: IndexTableProps) {
  return (
    <Table caption={caption}>
      <THead>
        <Th>{head}</Th>
        <Th align="right">Sits</Th>
        <Th align="right">Hours</Th>
        {COLUMNS.map((column) => (
          <Th key={column.head} align="right">
            {column.head}
          </Th>
        ))}
        <Th align="right">Sits with a bump</Th>
      </THead>
      <TBody>
        {groups.map(({ key, label, indices }) => (
          <Tr key={key}>
            <RowHead className="first-letter:uppercase">{label}</RowHead>
            <Td label="Sits" align="right" className="max-sm:text-left">
              {indices.sits}
            </Td>
            <Td label="Hours" align="right" className="max-sm:text-left">
              {indices.hours.toFixed(1)}
            </Td>
            {COLUMNS.map(({ head: name, of, as = 'number' }) => (
              <FigureCell key={name} label={name} figure={of(indices)} as={as} />
            ))}
            <Td label="Sits with a bump" align="right" className="max-sm:text-left">
              {indices.bumpedSits}
              <span className="ml-2 text-ink-soft text-xs sm:ml-0 sm:block">
                {figureText(indices.bumpedShare, 'percent')}
              </span>
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
