'use client';

import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { useToast } from '@/ui/toast';
import type { VisitLine } from '../visits-reads';
import { VISIT_LIST_WORDS } from '../words/visits';

const words = VISIT_LIST_WORDS;

export interface VisitListProps {
  club: string;
  lines: VisitLine[];
  remove: (club: string, values: { id: string }) => Promise<ActionResult<{ id: string }>>;
}

export function VisitList({ club, lines, remove }: VisitListProps) {
  const toast = useToast();
  async function takeOut(line: VisitLine) {
    const answer = await remove(club, { id: line.id }).catch(() => null);
    if (!answer) return words.lost;
    if (!answer.ok) return answer.error.message;
    toast({ title: words.takenOut });
  }
  return (
    <Table caption={words.caption} captionHidden>
      <THead>
        <Th>{words.what}</Th>
        <Th>{words.where}</Th>
        <Th>{words.when}</Th>
        <Th>{words.who}</Th>
        <Th>{words.bumped}</Th>
        <Th>{words.notes}</Th>
        <Th>
          <span className="sr-only">{words.takeOut}</span>
        </Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead>{line.kind}</RowHead>
            <Td label={words.where}>{line.where}</Td>
            <Td label={words.when}>{line.whenText}</Td>
            <Td label={words.who}>{line.memberName}</Td>
            <Td label={words.bumped}>{words.deer(line.bumped)}</Td>
            <Td label={words.notes}>{line.notes || '–'}</Td>
            <Td>
              {line.mayRemove && (
                <ConfirmDialog
                  title={words.confirmTitle}
                  confirmLabel={words.confirm}
                  danger
                  trigger={
                    <Button look="quiet" className="-my-2 whitespace-nowrap">
                      {words.takeOut}
                      <span className="sr-only">{words.takeOutOf(line.kind, line.where, line.whenText)}</span>
                    </Button>
                  }
                  onConfirm={() => takeOut(line)}
                >
                  <p>{words.confirmText}</p>
                </ConfirmDialog>
              )}
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
