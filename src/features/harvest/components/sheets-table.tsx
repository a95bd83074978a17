import { TextLink } from '@/ui/button';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { SheetLine } from '../sheet-line';
import { SHEETS_TABLE_WORDS } from '../words/season';

const words = SHEETS_TABLE_WORDS;

export function SheetsTable({ club, sheets }: { club: string; sheets: SheetLine[] }) {
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.deer}</Th>
        <Th>{words.hunter}</Th>
        <Th>{words.when}</Th>
        <Th>{words.where}</Th>
        <Th>{words.age}</Th>
        <Th align="right">{words.dressed}</Th>
        <Th>{words.antlers}</Th>
      </THead>
      <TBody>
        {sheets.map((sheet) => (
          <Tr key={sheet.id}>
            <RowHead>
              <TextLink href={`/clubs/${club}/season/harvest/${sheet.id}`}>
                {sheet.deer}
                <span className="sr-only">{`, ${sheet.whenText}`}</span>
              </TextLink>
            </RowHead>
            <Td label={words.hunter}>{sheet.hunter}</Td>
            <Td label={words.when}>{sheet.whenText}</Td>
            <Td label={words.where}>{sheet.where || '–'}</Td>
            <Td label={words.age}>{sheet.age || '–'}</Td>
            <Td label={words.dressed} align="right" className="max-sm:text-left">
              {sheet.weight || '–'}
            </Td>
            <Td label={words.antlers}>{sheet.antlers || '–'}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
