import type { ComponentProps } from 'react';
import { type InspectionItem, ITEM_ANSWERS } from '@/core/upkeep/inspection';
import { FieldGroup } from '@/ui/field';
import { ANSWER_WORDS, ITEM_WORDS } from '../words/inspections';

export interface AnswerFieldProps extends Omit<ComponentProps<'input'>, 'type' | 'value' | 'children'> {
  item: InspectionItem;
  error: string | undefined;
}

/** One thing to look at, its four answers side by side at thumb size: the list is long and filled in at the tree. */
export function AnswerField({ item, error, ...input }: AnswerFieldProps) {
  const { label, hint } = ITEM_WORDS[item];
  return (
    <FieldGroup label={label} hint={hint} error={error}>
      <div className="grid grid-cols-4">
        {ITEM_ANSWERS.map((value) => (
          <label
            key={value}
            className="-ml-px flex min-h-14 flex-col items-center justify-center gap-1 border border-rule-strong bg-panel px-1 py-1.5 text-center text-sm leading-tight first:ml-0 hover:bg-sunk has-checked:z-10 has-checked:border-2 has-checked:border-moss has-focus-visible:outline-2 has-focus-visible:outline-clay sm:min-h-12 sm:flex-row sm:justify-start sm:gap-3 sm:px-3 sm:text-base"
          >
            <input {...input} type="radio" value={value} className="tick size-5 shrink-0" />
            {ANSWER_WORDS[value]}
          </label>
        ))}
      </div>
    </FieldGroup>
  );
}
