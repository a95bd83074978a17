import { Button } from '@/ui/button';
import { DateInput, Select } from '@/ui/text-inputs';
import type { Period, PeriodChoice } from '../choose-period';
import { PERIOD_FORM_WORDS as words } from '../words/period';

interface PeriodFormProps {
  page: string;
  period: Period;
  choices: PeriodChoice[];
}

/** A plain form: what was chosen stands in the address. */
export function PeriodForm({ page, period, choices }: PeriodFormProps) {
  return (
    <form method="get" action={page} className="mb-6 flex flex-wrap items-end gap-x-4 gap-y-3 print:hidden">
      <Select label={words.season} name="season" defaultValue={period.season} options={choices} />
      <DateInput label={words.from} name="from" optional defaultValue={period.from} />
      <DateInput label={words.to} name="to" optional defaultValue={period.to} />
      <Button type="submit">{words.show}</Button>
    </form>
  );
}
