import { Notice } from '@/ui/notices';
import { ResendButton } from './resend-button';

interface Props {
  email: string;
  action: Parameters<typeof ResendButton>[0]['action'];
}

/** Stands on the pages of an account whose address is not confirmed. */
export function ConfirmEmailNotice({ email, action }: Props) {
  return (
    <Notice level="caution" title="Confirm your e-mail address" className="mb-6">
      <p className="mb-2">
        Open the link we mailed to <strong className="break-words">{email}</strong>. Until then you cannot invite
        anyone.
      </p>
      <ResendButton action={action} />
    </Notice>
  );
}
