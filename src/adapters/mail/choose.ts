import { type KeptMessage, makeKeptMail } from './kept';
import type { MailPort } from './port';
import { makeSmtpMail } from './smtp';

export interface MailSettings {
  smtpUrl?: string | undefined;
  mailFrom: string;
}

/** SMTP where a server is set, else the fake that keeps what it was given. */
export function chooseMail(settings: MailSettings, keep: (message: KeptMessage) => Promise<void>): MailPort {
  if (settings.smtpUrl) return makeSmtpMail({ url: settings.smtpUrl, from: settings.mailFrom });
  return makeKeptMail(settings.mailFrom, keep);
}
