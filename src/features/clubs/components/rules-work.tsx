'use client';

import { GROUND_WORKS } from '@/core/ground-work';
import { Card, Section } from '@/ui/page-parts';
import { WORK_RULE_WORDS as W, WORK_WORDS } from '../words/ground-work';
import { StatedFields } from './stated-fields';
import { useRulesFields } from './use-rules-fields';

/** What the state and the landowner say of work on the ground, in the club's words. */
export function RulesWork() {
  const field = useRulesFields();
  return (
    <Section id="work" title={W.group} note={W.note}>
      <div className="grid gap-4">
        {GROUND_WORKS.map((work) => (
          <Card key={work}>
            <fieldset>
              <legend className="mb-2 font-semibold font-serif text-lg">{WORK_WORDS[work]}</legend>
              <StatedFields
                field={field}
                paths={{
                  text: `workRules.${work}.text`,
                  source: `workRules.${work}.source`,
                  statedOn: `workRules.${work}.statedOn`,
                }}
                rows={2}
              />
            </fieldset>
          </Card>
        ))}
      </div>
    </Section>
  );
}
