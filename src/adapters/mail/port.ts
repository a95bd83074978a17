/** One mail to one person. */
export interface MailMessage {
  /** Stable over tries: the Message-ID is made of it, so a mail sent twice can be told as one. */
  id: string;
  to: { email: string; name: string };
  subject: string;
  text: string;
  html: string | null;
  /** An iCalendar part and the method it carries. */
  calendar: { method: 'REQUEST' | 'CANCEL' | 'PUBLISH'; content: string } | null;
  /** Further headers, such as List-Unsubscribe. */
  headers: Record<string, string>;
}

/** `permanent`: the same message will be refused again, so trying again is no use. */
export type MailResult = { ok: true; messageId: string } | { ok: false; permanent: boolean; message: string };

export interface MailPort {
  mode: 'smtp' | 'kept';
  /** Does not throw for a refusal or a lost connection. */
  send(message: MailMessage): Promise<MailResult>;
}
