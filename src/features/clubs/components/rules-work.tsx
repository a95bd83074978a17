'use client';

import { GROUND_WORKS } from '@/core/ground-work';
import { Card, Section } from '@/ui/page-parts';
import { DateInput, Textarea, TextInput } from '@/ui/text-inputs';
import { WORK_RULE_WORDS as W, WORK_WORDS } from '../words/ground-work';
import { useRulesFields } from './use-rules-fields';

/** What the state and the landowner say of work on the ground, in the club's words. */
export function RulesWork() {
  const field = useRulesFields();
  return (
    <Section id="work" title={W.group} note={W.note}>
      <div className="grid gap-4">
        {GROUND_WORKS.map((work) => (
          <Card key={work}>
            <fieldset className="grid gap-4 sm:grid-cols-2">
              <legend className="mb-2 font-semibold font-serif text-lg">{WORK_WORDS[work]}</legend>
              <Textarea
                label={W.rule}
                optional
                rows={2}
                fieldClassName="sm:col-span-2"
                {...field(`workRules.${work}.text`)}
              />
              <TextInput label={W.source} optional {...field(`workRules.${work}.source`)} />
              <DateInput label={W.statedOn} optional {...field(`workRules.${work}.statedOn`)} />
            </fieldset>
          </Card>
        ))}
      </div>
    </Section>
  );
}
