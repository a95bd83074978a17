import { TextLink } from '@/ui/button';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { SheetLine } from '../sheet-line';

export function SheetsTable({ club, sheets }: { club: string; sheets: SheetLine[] }) {
  return (
    <Table caption="Harvest sheets of the season, the latest first" captionHidden>
      <THead>
        <Th>Deer</Th>
        <Th>Taken by</Th>
        <Th>When</Th>
        <Th>Where</Th>
        <Th>Age</Th>
        <Th align="right">Dressed</Th>
        <Th>Antlers</Th>
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
            <Td label="Taken by">{sheet.hunter}</Td>
            <Td label="When">{sheet.whenText}</Td>
            <Td label="Where">{sheet.where || '–'}</Td>
            <Td label="Age">{sheet.age || '–'}</Td>
            <Td label="Dressed" align="right" className="max-sm:text-left">
              {sheet.weight || '–'}
            </Td>
            <Td label="Antlers">{sheet.antlers || '–'}</Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
