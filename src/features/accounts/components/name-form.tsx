'use client';

import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { changeNameSchema } from '../account-schema';
import { NAME_WORDS } from '../words/forms';

interface Props {
  name: string;
  action: (values: { name: string }) => Promise<ActionAnswer<null>>;
}

export function NameForm({ name, action }: Props) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: changeNameSchema,
    defaultValues: { name },
    submit: action,
    onDone: () => toast({ title: NAME_WORDS.saved }),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <TextInput label={NAME_WORDS.name} autoComplete="name" {...register('name')} error={errorOf('name')} required />
      <SubmitRow label={NAME_WORDS.save} look="plain" pending={pending} />
    </form>
  );
}
