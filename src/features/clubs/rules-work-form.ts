import { z } from 'zod';
import type { ClubRules } from '@/core/booking/rules';
import { GROUND_WORKS, type GroundWork } from '@/core/ground-work';
import type { TextReader } from './read-number';
import { readStated } from './rules-harvest-form';
import { RULES_ERRORS } from './words/field-errors';

const line = z.string().max(600, RULES_ERRORS.long600);
const stated = z.object({ text: line, source: line, statedOn: line });

/** Fields of the rules form about work on the ground. */
export const workRuleFields = {
  workRules: z.object({ mock_scrape: stated, water: stated, bait: stated, cutting: stated, planting: stated }),
};
type WorkFields = z.output<typeof workRuleFields.workRules>;

const each = <T>(make: (work: GroundWork) => T) =>
  Object.fromEntries(GROUND_WORKS.map((work) => [work, make(work)])) as Record<GroundWork, T>;

export function readWorkRules(form: TextReader, typed: WorkFields): ClubRules['workRules'] {
  return each((work) => {
    const at = `workRules.${work}`;
    return readStated(
      form,
      typed[work],
      { text: `${at}.text`, source: `${at}.source`, statedOn: `${at}.statedOn` },
      500,
    );
  });
}

/** The same as the form shows it. */
export function workRulesToForm({ workRules }: Pick<ClubRules, 'workRules'>): { workRules: WorkFields } {
  return { workRules: each((work) => workRules[work] ?? { text: '', source: '', statedOn: '' }) };
}
