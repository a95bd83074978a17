import type { Units } from '@/core/units';
import { CONTROL_CLASSES } from '@/ui/field';
import { Td, Tr } from '@/ui/table';
import { fateText } from '../fate';
import { choicesFor } from '../kind-values';
import type { ReviewRow } from '../review';
import { REVIEW_ROW_WORDS } from '../words/import';
import type { Judged } from './use-review';

const words = REVIEW_ROW_WORDS;

interface ReviewRowProps {
  judged: Judged;
  units: Units;
  disabled: boolean;
  onKind: (row: ReviewRow, kind: string) => void;
  onTaken: (row: ReviewRow, kind: string, taken: boolean) => void;
}

export function ReviewTableRow({ judged, units, disabled, onKind, onTaken }: ReviewRowProps) {
  const { row, choice, fate } = judged;
  const name = row.name || words.row(row.row);
  const may = fate === 'ready' || fate === 'twin';
  return (
    <Tr>
      <Td label={words.add}>
        <input
          type="checkbox"
          aria-label={words.addRow(name, row.row)}
          className="tick size-5"
          checked={choice.taken && may}
          disabled={disabled || !may}
          onChange={({ target }) => onTaken(row, choice.kind, target.checked)}
        />
      </Td>
      <Td label={words.name}>
        <div className="min-w-0">
          <span className="break-words font-serif font-semibold">{name}</span>
          {row.notes && (
            <span className="block max-w-prose truncate text-ink-soft text-sm">{row.notes.slice(0, 120)}</span>
          )}
        </div>
      </Td>
      <Td label={words.shape}>
        <div className="min-w-0">
          {row.shape === null ? '–' : words.shapes[row.shape]}
          {row.size.points > 1 && <span className="text-ink-soft">{words.points(row.size.points)}</span>}
        </div>
      </Td>
      <Td label={words.kind}>
        {row.shape === null ? (
          '–'
        ) : (
          <select
            aria-label={words.kindOf(name, row.row)}
            className={CONTROL_CLASSES}
            value={choice.kind}
            disabled={disabled}
            onChange={({ target }) => onKind(row, target.value)}
          >
            <option value="">{words.choose}</option>
            {choicesFor(row.shape).map((group) => (
              <optgroup key={group.label} label={group.label}>
                {group.options.map(({ value, label }) => (
                  <option key={value} value={value}>
                    {label}
                  </option>
                ))}
              </optgroup>
            ))}
          </select>
        )}
      </Td>
      <Td label={words.fate}>
        <div className="min-w-0">
          <span className={fate === 'ready' ? '' : 'font-semibold'}>{fateText(row, choice.kind, units)}</span>
          {row.remarks.map((remark) => (
            <span key={remark} className="block text-ink-soft text-sm">
              {remark}
            </span>
          ))}
        </div>
      </Td>
    </Tr>
  );
}
