import { env } from '@/env';
import { TextLink } from '@/ui/button';

/** Where mail is kept on this machine, the way to read it; else the usual place to look. */
export function MailHint() {
  if (!env.smtpUrl && env.devPages) {
    return (
      <p className="mt-2">
        No mail leaves this machine: read it at <TextLink href="/dev/mail">kept mail</TextLink>, a few seconds from now.
      </p>
    );
  }
  return <p className="mt-2">Nothing there after some minutes? Look among the junk mail.</p>;
}
