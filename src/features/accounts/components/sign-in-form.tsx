'use client';

import { useRouter } from 'next/navigation';
import { type SubmitEvent, startTransition, useActionState, useEffect, useRef, useState } from 'react';
import { TextLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { SIGN_IN_FORM_WORDS } from '../words/sign-in';

interface Props {
  next: string | undefined;
  action: (values: { email: string; password: string; next?: string }) => Promise<ActionAnswer<{ to: string }>>;
}

type Refused = { message: string; fields?: Record<string, string> };

const LOST: Refused = { message: SIGN_IN_FORM_WORDS.lost };
const FIELDS = ['email', 'password'] as const;

/** Checked by the server alone: the first page of all carries no schema and no form library to the phone. */
export function SignInForm({ next, action }: Props) {
  const router = useRouter();
  const form = useRef<HTMLFormElement>(null);
  const [ready, setReady] = useState(false);
  const [refused, send, pending] = useActionState<Refused | null, FormData>(async (_before, typed) => {
    const values = { email: String(typed.get('email')), password: String(typed.get('password')) };
    const answer = await action(next ? { ...values, next } : values).catch(() => null);
    if (answer?.ok) {
      router.push(answer.data.to);
      return null;
    }
    return answer ? answer.error : LOST;
  }, null);
  const errorOf = (name: (typeof FIELDS)[number]) => refused?.fields?.[name];
  const bad = FIELDS.filter(errorOf);
  const errors =
    bad.length > 0 ? bad.map((name) => ({ name, message: errorOf(name) ?? '' })) : refused ? [refused] : [];

  useEffect(() => setReady(true), []);
  useEffect(() => {
    if (refused) form.current?.querySelector<HTMLElement>('[aria-invalid]')?.focus();
  }, [refused]);

  // By hand and not by `action`: React would empty the fields after a refusal.
  function submit(event: SubmitEvent<HTMLFormElement>) {
    event.preventDefault();
    const typed = new FormData(event.currentTarget);
    startTransition(() => send(typed));
  }

  return (
    <form
      ref={form}
      method="post"
      noValidate
      data-ready={ready || undefined}
      onSubmit={submit}
      className="flex flex-col gap-5"
    >
      <FormErrorSummary errors={errors} title={SIGN_IN_FORM_WORDS.refused} />
      <TextInput
        label={SIGN_IN_FORM_WORDS.email}
        type="email"
        name="email"
        autoComplete="username"
        error={errorOf('email')}
        required
      />
      <TextInput
        label={SIGN_IN_FORM_WORDS.password}
        type="password"
        name="password"
        autoComplete="current-password"
        error={errorOf('password')}
        required
      />
      <SubmitRow label={SIGN_IN_FORM_WORDS.signIn} pending={pending} pendingLabel={SIGN_IN_FORM_WORDS.signingIn}>
        <TextLink href="/forgot">{SIGN_IN_FORM_WORDS.forgot}</TextLink>
      </SubmitRow>
    </form>
  );
}
