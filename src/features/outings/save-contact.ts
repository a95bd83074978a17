import { write } from '@/db/client';
import { auditAccount } from '@/features/accounts/audit-account';
import { hashSecret, newSecret } from '@/lib/secrets';
import { AppError } from '@/server/errors';
import { type RateRule, takeRate } from '@/server/rate-limit';
import { mailContactAsk } from './contact-mails';
import type { SaveContactInput, SwitchContactInput } from './contact-schema';
import { type ContactRow, deleteContact, findContact, saveContactRow, updateContact } from './contacts-data';
import { CONTACT_AUDIT, CONTACT_ERRORS } from './words/contact';

interface Member {
  id: string;
  name: string;
  email: string;
  emailVerifiedAt: number | null;
}

const DAY_MS = 24 * 3_600_000;
const ASK_LASTS_MS = 14 * DAY_MS;
/** Strangers are asked: few mails a day, whatever addresses are typed. Our choice. */
const ASKS: RateRule = { name: 'safety-contact', most: 5, windowMs: DAY_MS };

const invalid = (message: string) => new AppError('invalid', message, { fields: { email: message } });

function refuse(member: Member, input: SaveContactInput, before: ContactRow | null): void {
  if (member.emailVerifiedAt === null) {
    throw new AppError('conflict', CONTACT_ERRORS.unconfirmed);
  }
  if (input.email === member.email) throw invalid(CONTACT_ERRORS.yourself);
  if (before?.declinedAt && before.email === input.email) {
    throw invalid(CONTACT_ERRORS.declined(before.name));
  }
}

/** Whether the person has agreed, or has been asked and may still answer. */
const standsAsIs = (before: ContactRow | null, email: string, now: number) =>
  before?.email === email && (before.consentedAt !== null || before.expiresAt > now);

/** Names a safety contact and asks them. Another address is asked anew; a new name for the same address is only kept. */
export async function saveContact(member: Member, input: SaveContactInput, now: number): Promise<{ asked: boolean }> {
  const seen = await findContact(member.id);
  refuse(member, input, seen);
  if (!standsAsIs(seen, input.email, now)) await takeRate(ASKS, [member.id], now);
  return write(async (tx) => {
    const before = await findContact(member.id, tx);
    refuse(member, input, before);
    if (standsAsIs(before, input.email, now)) {
      await updateContact(tx, member.id, { name: input.name });
      return { asked: false };
    }
    const secret = newSecret();
    await saveContactRow(tx, {
      userId: member.id,
      name: input.name,
      email: input.email,
      secretHash: hashSecret(secret),
      askedAt: now,
      expiresAt: now + ASK_LASTS_MS,
      consentedAt: null,
      declinedAt: null,
      off: false,
    });
    await mailContactAsk(tx, member, input, secret, now);
    await auditAccount(tx, member, 'contact_named', CONTACT_AUDIT.named(member.name), now);
    return { asked: true };
  });
}

/** The member's own switch: off, nobody is told until it is on again. */
export async function switchContact(member: Member, input: SwitchContactInput, now: number): Promise<void> {
  await write(async (tx) => {
    if (!(await findContact(member.id, tx))) throw new AppError('conflict', CONTACT_ERRORS.none);
    await updateContact(tx, member.id, { off: input.off });
    await auditAccount(tx, member, 'contact_switched', CONTACT_AUDIT.switched(member.name, input.off), now);
  });
}

export async function removeContact(member: Member, now: number): Promise<void> {
  await write(async (tx) => {
    if (!(await findContact(member.id, tx))) return;
    await deleteContact(tx, member.id);
    await auditAccount(tx, member, 'contact_removed', CONTACT_AUDIT.removed(member.name), now);
  });
}
