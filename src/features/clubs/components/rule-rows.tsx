import type { ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { Button } from '@/ui/button';
import { FieldError } from '@/ui/field';
import { Card, Section } from '@/ui/page-parts';
import type { RulesForm } from '../rules-form-schema';

interface Props {
  name: 'legalLight' | 'seasons' | 'harvestQuotas';
  /** Keys of the rows, in their order. */
  keys: string[];
  words: { title: string; note: string; add: string; remove: string };
  most: number;
  onAdd: () => void;
  onRemove: (index: number) => void;
  children: (index: number) => ReactNode;
}

/** A part of the rules that is a list: a card a row, each with its way out, and one button for a new one. */
export function RuleRows({ name, keys, words, most, onAdd, onRemove, children }: Props) {
  const error = useFormContext<RulesForm>().formState.errors[name];
  return (
    <Section title={words.title} note={words.note}>
      <FieldError>{error?.root?.message ?? error?.message}</FieldError>
      <div className="flex flex-col gap-4">
        {keys.map((key, i) => (
          <Card key={key} className="flex flex-col gap-4">
            {children(i)}
            <div>
              <Button look="quiet" onClick={() => onRemove(i)}>
                {words.remove}
              </Button>
            </div>
          </Card>
        ))}
      </div>
      <Button className="mt-3" onClick={onAdd} disabled={keys.length >= most}>
        {words.add}
      </Button>
    </Section>
  );
}
