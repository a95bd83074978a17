import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import type { AuditLine } from '../read-audit';
import { AUDIT_WORDS } from '../words/records';

export function AuditTable({ lines }: { lines: AuditLine[] }) {
  return (
    <Table caption={AUDIT_WORDS.caption} captionHidden>
      <THead>
        <Th>{AUDIT_WORDS.when}</Th>
        <Th>{AUDIT_WORDS.who}</Th>
        <Th>{AUDIT_WORDS.what}</Th>
        <Th>{AUDIT_WORDS.inWords}</Th>
      </THead>
      <TBody>
        {lines.map((line) => (
          <Tr key={line.id}>
            <RowHead className="font-normal! sm:whitespace-nowrap">{line.when}</RowHead>
            <Td label={AUDIT_WORDS.who}>{line.who}</Td>
            <Td label={AUDIT_WORDS.what}>{line.what}</Td>
            <Td label={AUDIT_WORDS.inWords} className="min-w-0">
              <div className="min-w-0">
                <span className="break-words">{line.summary}</span>
                {line.details.length > 0 && (
                  <details className="mt-1 text-sm">
                    <summary className="min-h-8 cursor-pointer text-ink-soft">{AUDIT_WORDS.details}</summary>
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
