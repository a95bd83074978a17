import { Button, ButtonLink } from '@/ui/button';
import { DateInput, Select, TextInput } from '@/ui/text-inputs';
import type { AuditFilter } from '../audit-schema';
import type { AuditPage } from '../read-audit';
import { AUDIT_FILTERS_WORDS } from '../words/records';

interface Props {
  filter: AuditFilter;
  /** Beside their fields, when an address was typed by hand. */
  errors: Record<string, string>;
  people: AuditPage['people'];
  actions: AuditPage['actions'];
  /** The page without a filter. */
  page: string;
}

const choices = (list: { id: string; name: string }[]) => list.map(({ id, name }) => ({ value: id, label: name }));

/** A plain form sent by GET: what is asked for stands in the address. */
export function AuditFilters({ filter, errors, people, actions, page }: Props) {
  return (
    <form method="get" action={page} className="mb-6 flex flex-col gap-4">
      <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-3">
        <Select
          label={AUDIT_FILTERS_WORDS.person}
          name="person"
          placeholder={AUDIT_FILTERS_WORDS.everyone}
          options={choices(people)}
          defaultValue={filter.person ?? ''}
        />
        <Select
          label={AUDIT_FILTERS_WORDS.what}
          name="action"
          placeholder={AUDIT_FILTERS_WORDS.everything}
          options={choices(actions)}
          defaultValue={filter.action ?? ''}
        />
        <TextInput
          label={AUDIT_FILTERS_WORDS.words}
          name="text"
          type="search"
          defaultValue={filter.text ?? ''}
          error={errors.text}
        />
        <DateInput
          label={AUDIT_FILTERS_WORDS.fromDay}
          name="from"
          defaultValue={filter.from ?? ''}
          error={errors.from}
        />
        <DateInput label={AUDIT_FILTERS_WORDS.toDay} name="to" defaultValue={filter.to ?? ''} error={errors.to} />
      </div>
      <div className="flex flex-wrap gap-2">
        <Button type="submit" look="primary">
          {AUDIT_FILTERS_WORDS.show}
        </Button>
        <ButtonLink href={page} look="quiet">
          {AUDIT_FILTERS_WORDS.clear}
        </ButtonLink>
      </div>
    </form>
  );
}
