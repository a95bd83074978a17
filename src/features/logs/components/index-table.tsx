import { type Figure, figureText, type Indices, intervalText } from '@/core/indices';
import { FigureHead, FigureTable } from '@/ui/figure-table';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { IndexGroup } from '../sightings-reads';
import { INDEX_TABLE_WORDS } from '../words/sightings';

const words = INDEX_TABLE_WORDS;

interface Column {
  head: string;
  of: (indices: Indices) => Figure;
  as?: 'number' | 'percent';
}

const COLUMNS: Column[] = [
  { head: words.deer, of: ({ perHour }) => perHour.all },
  { head: words.bucks, of: ({ perHour }) => perHour.bucks },
  { head: words.does, of: ({ perHour }) => perHour.does },
  { head: words.fawns, of: ({ perHour }) => perHour.fawns },
  { head: words.doesPerBuck, of: ({ doesPerBuck }) => doesPerBuck },
  { head: words.fawnsPerDoe, of: ({ fawnsPerDoe }) => fawnsPerDoe },
  { head: words.unknown, of: ({ unknownShare }) => unknownShare, as: 'percent' },
];

function FigureCell({ figure, as }: { figure: Figure; as: 'number' | 'percent' }) {
  return (
    <Td align="right">
      <span className={figure.known ? 'whitespace-nowrap' : 'text-ink-soft text-sm'}>{figureText(figure, as)}</span>
      {figure.known && (
        <span className="block whitespace-nowrap text-ink-soft text-xs">{intervalText(figure, as)}</span>
      )}
    </Td>
  );
}

interface IndexTableProps {
  caption: string;
  head: string;
  groups: IndexGroup[];
}

/** The indices of some groups of sits; the 95 % interval stands small below each. */
export function IndexTable({ caption, head, groups }: IndexTableProps) {
  return (
    <FigureTable caption={caption}>
      <THead>
        <Th>{head}</Th>
        <Th align="right">{words.sits}</Th>
        <Th align="right">{words.hours}</Th>
        {COLUMNS.map((column) => (
          <Th key={column.head} align="right">
            {column.head}
          </Th>
        ))}
        <Th align="right">{words.bumped}</Th>
      </THead>
      <TBody>
        {groups.map(({ key, label, indices }) => (
          <Tr key={key}>
            <FigureHead>{label}</FigureHead>
            <Td align="right">{indices.sits}</Td>
            <Td align="right">{indices.hours.toFixed(1)}</Td>
            {COLUMNS.map(({ head: name, of, as = 'number' }) => (
              <FigureCell key={name} figure={of(indices)} as={as} />
            ))}
            <Td align="right">
              {indices.bumpedSits}
              <span className="block text-ink-soft text-xs">{figureText(indices.bumpedShare, 'percent')}</span>
            </Td>
          </Tr>
        ))}
      </TBody>
    </FigureTable>
  );
}
