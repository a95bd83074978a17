import { DateInput, Textarea, TextInput } from '@/ui/text-inputs';
import { STATED_WORDS } from '../words/rules-form';
import type { useRulesFields } from './use-rules-fields';

type Field = ReturnType<typeof useRulesFields>;
type Path = Parameters<Field>[0];

interface Props {
  field: Field;
  paths: { text: Path; source: Path; statedOn: Path };
  label?: string;
  rows: number;
}

/** A rule in the club's words, where it is written, and the day an officer read it there; all three or none. */
export function StatedFields({ field, paths, label = STATED_WORDS.rule, rows }: Props) {
  return (
    <div className="grid gap-5 sm:grid-cols-2">
      <Textarea label={label} optional rows={rows} fieldClassName="sm:col-span-2" {...field(paths.text)} />
      <TextInput label={STATED_WORDS.source} optional {...field(paths.source)} />
      <DateInput label={STATED_WORDS.statedOn} optional {...field(paths.statedOn)} />
    </div>
  );
}
