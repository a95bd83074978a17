/** Apart from the other forms: the button stands in the frame of every page of a club. */
export const RESEND_WORDS = {
  lost: 'The server could not be reached. Try again.',
  sent: (email: string) => `Sent to ${email}. Only the newest link works.`,
  sending: 'Sending…',
  send: 'Send the link again',
} as const;
