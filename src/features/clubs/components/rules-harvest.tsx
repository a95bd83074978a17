'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { Section } from '@/ui/page-parts';
import { NumberInput, Select } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
import { RULES_QUOTAS_WORDS, STATE_RULE_WORDS } from '../words/rules-form';
import { RuleRows } from './rule-rows';
import { StatedFields } from './stated-fields';
import { useRulesFields } from './use-rules-fields';

const DEER = [
  { value: 'any', label: RULES_QUOTAS_WORDS.any },
  { value: 'antlered', label: RULES_QUOTAS_WORDS.antlered },
  { value: 'antlerless', label: RULES_QUOTAS_WORDS.antlerless },
];
const PER = [
  { value: 'club', label: RULES_QUOTAS_WORDS.club },
  { value: 'member', label: RULES_QUOTAS_WORDS.member },
  { value: 'member_guests', label: RULES_QUOTAS_WORDS.memberGuests },
];

/** Quotas of deer, and the state's rules in the club's words. */
export function RulesHarvest() {
  const { control } = useFormContext<RulesForm>();
  const { fields, append, remove } = useFieldArray({ control, name: 'harvestQuotas' });
  const field = useRulesFields();
  return (
    <>
      <RuleRows
        name="harvestQuotas"
        keys={fields.map((row) => row.id)}
        words={RULES_QUOTAS_WORDS}
        most={20}
        onAdd={() => append({ deer: 'antlered', per: 'member', most: '' })}
        onRemove={remove}
      >
        {(i) => (
          <div className="grid gap-4 sm:grid-cols-2">
            <Select label={RULES_QUOTAS_WORDS.deer} options={DEER} {...field(`harvestQuotas.${i}.deer`)} />
            <Select label={RULES_QUOTAS_WORDS.per} options={PER} {...field(`harvestQuotas.${i}.per`)} />
            <NumberInput
              label={RULES_QUOTAS_WORDS.atMost}
              unit={RULES_QUOTAS_WORDS.deerUnit}
              step="1"
              {...field(`harvestQuotas.${i}.most`)}
            />
          </div>
        )}
      </RuleRows>
      <Section title={STATE_RULE_WORDS.title} note={STATE_RULE_WORDS.note}>
        <StatedFields
          field={field}
          paths={{ text: 'stateRuleText', source: 'stateRuleSource', statedOn: 'stateRuleStatedOn' }}
          label={STATE_RULE_WORDS.rule}
          rows={6}
        />
      </Section>
    </>
  );
}
