'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { type SubmitEvent, useEffect, useState } from 'react';
import { type DefaultValues, type FieldErrors, type FieldValues, type Path, useForm } from 'react-hook-form';
import type { z } from 'zod';
import { FORM_WORDS } from '../words/forms';

/** What a server action answers. */
export type ActionAnswer<T> =
  | { ok: true; data: T }
  | { ok: false; error: { message: string; fields?: Record<string, string> } };

export interface ActionFormOptions<Values extends FieldValues, T> {
  /** The schema the server parses with. */
  schema: z.ZodType<unknown, Values>;
  defaultValues: DefaultValues<Values>;
  /** Gets what was typed, as it was typed: the server parses it again. */
  submit: (values: Values) => Promise<ActionAnswer<T>>;
  onDone?: (data: T) => void | Promise<void>;
}

interface NamedError {
  name?: string;
  message: string;
}

const WHOLE_FORM = 'root.server';

/** react-hook-form's tree of errors as a list, with the path of each field. */
export function listErrors(errors: object, path: string[] = []): NamedError[] {
  return Object.entries(errors).flatMap(([key, value]): NamedError[] => {
    if (typeof value !== 'object' || value === null || key === 'ref') return [];
    const at = [...path, key];
    const own = 'message' in value && typeof value.message === 'string' && value.message ? [value.message] : [];
    const name = at[0] === 'root' ? {} : { name: at.join('.') };
    return [...own.map((message) => ({ ...name, message })), ...listErrors(value, at)];
  });
}

/** A form over a server action: the errors of both sides stand beside their fields, and nothing typed is lost. */
export function useActionForm<Values extends FieldValues, T>(options: ActionFormOptions<Values, T>) {
  const { schema, defaultValues, submit, onDone } = options;
  const form = useForm<Values, unknown, Values>({
    resolver: zodResolver(schema, undefined, { raw: true }),
    defaultValues,
    // A fault once shown goes while it is mended, not as the hand leaves for the button below: that would move under it.
    mode: 'onTouched',
  });
  const [ready, setReady] = useState(false);
  const [summary, setSummary] = useState<NamedError[]>([]);
  useEffect(() => setReady(true), []);

  function refuse(error: { message: string; fields?: Record<string, string> }) {
    const fields = Object.entries(error.fields ?? {}).filter(([path]) => path !== '');
    for (const [path, message] of fields) form.setError(path as Path<Values>, { type: 'server', message });
    if (fields.length === 0) form.setError(WHOLE_FORM, { type: 'server', message: error.message });
    setSummary(fields.length === 0 ? [error] : fields.map(([name, message]) => ({ name, message })));
  }

  const send = form.handleSubmit(
    async (values) => {
      const answer = await submit(values).catch(() => null);
      if (!answer) return refuse({ message: FORM_WORDS.lost });
      if (!answer.ok) return refuse(answer.error);
      setSummary([]);
      await onDone?.(answer.data);
    },
    (errors) => setSummary(listErrors(errors)),
  );

  const errors: FieldErrors<Values> = form.formState.errors;
  const list = listErrors(errors);
  return {
    form,
    register: form.register,
    /** The error beside one field, by its path. */
    errorOf: (path: Path<Values>) => list.find((error) => error.name === path)?.message,
    /** What was wrong when the form was last sent, for FormErrorSummary. */
    errors: summary,
    pending: form.formState.isSubmitting,
    /** Spread on the form. Post keeps what is typed out of the address if it is sent before the script runs. */
    formProps: {
      method: 'post' as const,
      noValidate: true,
      'data-ready': ready || undefined,
      onSubmit: (event: SubmitEvent<HTMLFormElement>) => void send(event),
    },
  };
}
