import { findContact } from './contacts-data';

export type ContactState = 'asked' | 'expired' | 'agreed' | 'declined';

export interface ContactView {
  name: string;
  email: string;
  state: ContactState;
  /** The member's own switch. */
  off: boolean;
}

/** A person's own safety contact; null: none is named. */
export async function readContact(userId: string, now: number): Promise<ContactView | null> {
  const row = await findContact(userId);
  if (!row) return null;
  const { name, email, off, consentedAt, declinedAt, expiresAt } = row;
  const open: ContactState = expiresAt > now ? 'asked' : 'expired';
  return {
    name,
    email,
    off,
    state: consentedAt !== null ? 'agreed' : declinedAt !== null ? 'declined' : open,
  };
}
