import { createTransport } from 'nodemailer';
import type { MailMessage, MailPort } from './port';
import { toMailOptions } from './to-mail-options';

export interface KeptMessage extends MailMessage {
  messageId: string;
  /** The whole message as it would have gone out. */
  raw: string;
}

/** Sends nothing: writes each message out in full, as SMTP would, and hands it to `keep`. */
export function makeKeptMail(from: string, keep: (message: KeptMessage) => Promise<void>): MailPort {
  const transport = createTransport({ streamTransport: true, buffer: true, newline: 'windows' });
  return {
    mode: 'kept',
    async send(message) {
      try {
        const info = await transport.sendMail(toMailOptions(message, from));
        const raw = Buffer.isBuffer(info.message) ? info.message.toString('utf8') : '';
        await keep({ ...message, messageId: info.messageId, raw });
        return { ok: true, messageId: info.messageId };
      } catch (error) {
        return { ok: false, permanent: false, message: error instanceof Error ? error.message : String(error) };
      }
    },
  };
}
