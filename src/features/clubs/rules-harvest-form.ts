import { z } from 'zod';
import type { ClubRules, OrangeRule } from '@/core/booking/rules';
import { isDay } from '@/core/day-time';
import { QUOTA_DEER, QUOTA_PER } from '@/core/harvest/harvest-types';
import type { TextReader } from './read-number';
import { RULES_ERRORS } from './words/field-errors';

const line = z.string().max(600, RULES_ERRORS.long600);

/** Fields of the rules form about deer taken. */
export const harvestRuleFields = {
  harvestQuotas: z
    .array(z.object({ deer: z.enum(QUOTA_DEER), per: z.enum(QUOTA_PER), most: line }))
    .max(20, RULES_ERRORS.quotas),
  stateRuleText: z.string().max(2000, RULES_ERRORS.long2000),
  stateRuleSource: line,
  stateRuleStatedOn: line,
};

type HarvestFields = z.output<z.ZodObject<typeof harvestRuleFields>>;

interface StatedFields {
  text: string;
  source: string;
  statedOn: string;
}

/** All three, or none: a rule without its source and day is no record. `at` names the fields of the form, by dotted path. */
export function readStated(form: TextReader, typed: StatedFields, at: StatedFields, most: number): OrangeRule | null {
  const text = typed.text.trim();
  const source = typed.source.trim();
  const statedOn = typed.statedOn.trim();
  if (text === '' && source === '' && statedOn === '') return null;
  if (text === '') form.fail(at.text.split('.'), RULES_ERRORS.rule);
  if (text.length > most) form.fail(at.text.split('.'), RULES_ERRORS.ruleLong(most));
  if (source === '') form.fail(at.source.split('.'), RULES_ERRORS.source);
  if (source.length > 300) form.fail(at.source.split('.'), RULES_ERRORS.sourceLong);
  if (!isDay(statedOn)) form.fail(at.statedOn.split('.'), RULES_ERRORS.statedOn);
  return { text, source, statedOn };
}

export function readHarvestRules(
  form: TextReader,
  typed: HarvestFields,
): Pick<ClubRules, 'harvestQuotas' | 'stateHarvestRule'> {
  return {
    harvestQuotas: typed.harvestQuotas.map(({ deer, per, most }, i) => ({
      deer,
      per,
      most: form.needNumber(['harvestQuotas', i, 'most'], most, {
        label: RULES_ERRORS.deer,
        min: 0,
        max: 1000,
        whole: true,
      }),
    })),
    stateHarvestRule: readStated(
      form,
      { text: typed.stateRuleText, source: typed.stateRuleSource, statedOn: typed.stateRuleStatedOn },
      { text: 'stateRuleText', source: 'stateRuleSource', statedOn: 'stateRuleStatedOn' },
      2000,
    ),
  };
}

/** The same as the form shows it. */
export function harvestRulesToForm(rules: Pick<ClubRules, 'harvestQuotas' | 'stateHarvestRule'>): HarvestFields {
  const { harvestQuotas, stateHarvestRule } = rules;
  return {
    harvestQuotas: harvestQuotas.map(({ most, ...quota }) => ({ ...quota, most: String(most) })),
    stateRuleText: stateHarvestRule?.text ?? '',
    stateRuleSource: stateHarvestRule?.source ?? '',
    stateRuleStatedOn: stateHarvestRule?.statedOn ?? '',
  };
}
