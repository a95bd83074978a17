import { TextInput, type TextInputProps } from '@/ui/text-inputs';
import { ACCOUNT_FIELD_WORDS } from '../words/forms';

/** A field of an account with its own label, spread with `register()`; whatever else is given goes before. */
type Props = Omit<TextInputProps, 'label' | 'type' | 'autoComplete'> & { label?: string };

export function NameInput(props: Props) {
  return (
    <TextInput
      label={ACCOUNT_FIELD_WORDS.name}
      hint={ACCOUNT_FIELD_WORDS.nameHint}
      autoComplete="name"
      required
      {...props}
    />
  );
}

export function EmailInput(props: Props) {
  return <TextInput label={ACCOUNT_FIELD_WORDS.email} required {...props} type="email" autoComplete="username" />;
}

export function NewPasswordInput(props: Props) {
  return (
    <TextInput
      label={ACCOUNT_FIELD_WORDS.password}
      hint={ACCOUNT_FIELD_WORDS.passwordHint}
      required
      {...props}
      type="password"
      autoComplete="new-password"
    />
  );
}

export function CurrentPasswordInput(props: Props) {
  return (
    <TextInput
      label={ACCOUNT_FIELD_WORDS.password}
      required
      {...props}
      type="password"
      autoComplete="current-password"
    />
  );
}
