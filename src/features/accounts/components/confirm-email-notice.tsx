import { Notice } from '@/ui/notices';
import { CONFIRM_EMAIL_NOTICE } from '../words/forms';
import { ResendButton } from './resend-button';

interface Props {
  email: string;
  action: Parameters<typeof ResendButton>[0]['action'];
}

/** Stands on the pages of an account whose address is not confirmed. */
export function ConfirmEmailNotice({ email, action }: Props) {
  return (
    <Notice level="caution" title={CONFIRM_EMAIL_NOTICE.title} className="mb-6">
      <p className="mb-2">
        {CONFIRM_EMAIL_NOTICE.beforeEmail}
        <strong className="break-words">{email}</strong>
        {CONFIRM_EMAIL_NOTICE.afterEmail}
      </p>
      <ResendButton action={action} />
    </Notice>
  );
}
