import { LOST } from '@/ui/words/lost';

/** Apart from the other forms: the button stands in the frame of every page of a club. */
export const RESEND_WORDS = {
  lost: LOST,
  sent: (email: string) => `Sent to ${email}. Only the newest link works.`,
  sending: 'Sending…',
  send: 'Send the link again',
} as const;
