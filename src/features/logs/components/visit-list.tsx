'use client';

import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { useToast } from '@/ui/toast';
import type { VisitLine } from '../visits-reads';

export interface VisitListProps {
  club: string;
  lines: VisitLine[];
  remove: (club: string, values: { id: string }) => Promise<ActionResult<{ id: string }>>;
}

export function VisitList({ club, lines, remove }: VisitListProps) {
  const toast = useToast();
  async function takeOut(line: VisitLine) {
    const answer = await remove(club, { id: line.id }).catch(() => null);
    if (!answer) return 'The server could not be reached. Try again.';
    if (!answer.ok) return answer.error.message;
    toast({ title: 'The visit is taken out' });
  }
  return (
    <Table caption="Visits of the last month, the latest first" captionHidden>
      <THead>
        <Th>What</Th>
        <Th>Where</Th>
        <Th>When</Th>
        <Th>Who</Th>
        <Th>Bumped</Th>
        <Th>Notes</Th>
        <Th>
          <span className="sr-only">Take out</span>
        </Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead>{line.kind}</RowHead>
            <Td label="Where">{line.where}</Td>
            <Td label="When">{line.whenText}</Td>
            <Td label="Who">{line.memberName}</Td>
            <Td label="Bumped">{line.bumped > 0 ? `${line.bumped} deer` : 'None'}</Td>
            <Td label="Notes">{line.notes || '–'}</Td>
            <Td>
              {line.mayRemove && (
                <ConfirmDialog
                  title="Take this visit out?"
                  confirmLabel="Take it out"
                  danger
                  trigger={
                    <Button look="quiet" className="-my-2 whitespace-nowrap">
                      Take out<span className="sr-only"> {`${line.kind}, ${line.where}, ${line.whenText}`}</span>
                    </Button>
                  }
                  onConfirm={() => takeOut(line)}
                >
                  <p>It no longer counts as pressure. The audit log keeps that it was written.</p>
                </ConfirmDialog>
              )}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
