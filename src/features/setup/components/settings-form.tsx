'use client';

import { useRouter } from 'next/navigation';
import { DEFAULT_SETUP, SETUP_BOUNDS } from '@/core/setup-check/setup-settings';
import type { Units } from '@/core/units';
import { Button, ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { Section } from '@/ui/page-parts';
import { TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type SettingKey, settingText, settingUnit } from '../setting-text';
import { makeSettingsSchema, type SettingsForm as Values } from '../settings-schema';
import { SETTING_GROUPS, SETTING_LABELS, SETTING_WORDS as W } from '../words/settings';

export interface SettingsFormProps {
  club: string;
  units: Units;
  values: Values;
  action: (club: string, values: Values) => Promise<ActionAnswer<{ changed: number }>>;
}

const SCHEMAS = { us: makeSettingsSchema('us'), metric: makeSettingsSchema('metric') };

function hintOf(key: SettingKey, units: Units): string {
  const { least, most } = SETUP_BOUNDS[key];
  const unit = settingUnit(key, units);
  const text = (value: number) => settingText(key, value, units);
  return W.hint(text(DEFAULT_SETUP[key]), text(least), text(most), unit === '°' ? unit : ` ${unit}`);
}

/** A club's own distances and shares; a blank one is what comes with the product, written in its hint. */
export function SettingsForm({ club, units, values, action }: SettingsFormProps) {
  const router = useRouter();
  const toast = useToast();
  const page = `/clubs/${club}/season/setup`;
  const { form, register, errorOf, errors, pending, formProps } = useActionForm<Values, { changed: number }>({
    schema: SCHEMAS[units],
    defaultValues: values,
    submit: (typed) => action(club, typed),
    onDone: ({ changed }) => {
      toast({ title: changed === 0 ? W.same : W.saved(changed) });
      router.push(page);
    },
  });
  function reset() {
    for (const { keys } of SETTING_GROUPS) {
      for (const key of keys) form.setValue(`settings.${key}`, '', { shouldDirty: true, shouldValidate: true });
    }
  }
  return (
    <form {...formProps}>
      <FormErrorSummary errors={errors} />
      <div className="mb-6 flex flex-wrap items-center gap-3">
        <p className="text-ink-soft">{W.blank}</p>
        <Button onClick={reset}>{W.reset}</Button>
      </div>
      {SETTING_GROUPS.map(({ title, keys }) => (
        <Section key={title} title={title}>
          <div className="grid items-end gap-x-8 gap-y-5 sm:grid-cols-2">
            {keys.map((key) => (
              <TextInput
                key={key}
                label={SETTING_LABELS[key]}
                hint={hintOf(key, units)}
                optional
                inputMode="decimal"
                autoComplete="off"
                className="max-w-32"
                unit={settingUnit(key, units)}
                {...register(`settings.${key}`)}
                error={errorOf(`settings.${key}`)}
              />
            ))}
          </div>
        </Section>
      ))}
      <SubmitRow label={W.save} pending={pending} pendingLabel={W.saving} className="mt-8">
        <ButtonLink href={page} look="quiet">
          {W.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
