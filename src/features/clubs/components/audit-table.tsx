import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { AuditLine } from '../read-audit';

export function AuditTable({ lines }: { lines: AuditLine[] }) {
  return (
    <Table caption="What was done, the newest first" captionHidden>
      <THead>
        <Th>When</Th>
        <Th>Who</Th>
        <Th>What</Th>
        <Th>In words</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead className="font-normal! sm:whitespace-nowrap">{line.when}</RowHead>
            <Td label="Who">{line.who}</Td>
            <Td label="What">{line.what}</Td>
            <Td label="In words" className="min-w-0">
              <div className="min-w-0">
                <span className="break-words">{line.summary}</span>
                {line.details.length > 0 && (
                  <details className="mt-1 text-sm">
                    <summary className="min-h-8 cursor-pointer text-ink-soft">Details</summary>
                    <dl className="mt-1 grid gap-x-3 gap-y-0.5 sm:grid-cols-[auto_minmax(0,1fr)]">
                      {line.details.map(({ term, text }) => (
                        <div key={`${term}:${text}`} className="contents">
                          <dt className="text-ink-soft">{term}</dt>
                          <dd className="min-w-0 break-words">{text}</dd>
                        </div>
                      ))}
                    </dl>
                  </details>
                )}
              </div>
            </Td>
          </Tr>
        ))}
      </TBody>
    </Table>
  );
}
