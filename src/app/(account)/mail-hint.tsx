import { env } from '@/env';
import { MAIL_HINT_WORDS } from '@/features/accounts/words/pages';
import { TextLink } from '@/ui/button';

/** Where mail is kept on this machine, the way to read it; else the usual place to look. */
export function MailHint() {
  if (!env.smtpUrl && env.devPages) {
    return (
      <p className="mt-2">
        {MAIL_HINT_WORDS.localBefore}
        <TextLink href="/dev/mail">{MAIL_HINT_WORDS.localLink}</TextLink>
        {MAIL_HINT_WORDS.localAfter}
      </p>
    );
  }
  return <p className="mt-2">{MAIL_HINT_WORDS.junk}</p>;
}
