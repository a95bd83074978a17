import type { SendMailOptions } from 'nodemailer';
import type { MailMessage } from './port';

/** `Name <box@host>` or `box@host` -> host. */
export function domainOf(address: string): string {
  return /@([a-z0-9.-]+)/i.exec(address)?.[1]?.toLowerCase() ?? 'localhost';
}

export function messageIdOf(message: MailMessage, from: string): string {
  return `<${message.id}@${domainOf(from)}>`;
}

/** RFC 3834: a machine wrote it, so no machine should answer. */
const AUTO = { 'Auto-Submitted': 'auto-generated' };

export function toMailOptions(message: MailMessage, from: string): SendMailOptions {
  const { to, subject, text, html, calendar, headers } = message;
  return {
    messageId: messageIdOf(message, from),
    from,
    to: to.name ? { name: to.name, address: to.email } : to.email,
    subject,
    text,
    ...(html === null ? {} : { html }),
    ...(calendar === null
      ? {}
      : { icalEvent: { method: calendar.method, filename: 'windrest.ics', content: calendar.content } }),
    headers: { ...AUTO, ...headers },
    disableFileAccess: true,
    disableUrlAccess: true,
  };
}
