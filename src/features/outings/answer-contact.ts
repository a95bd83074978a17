import type { ReadFrom } from '@/db/client';
import { write } from '@/db/client';
import { hashSecret } from '@/lib/secrets';
import { audit } from '@/server/audit';
import { AppError } from '@/server/errors';
import { mailContactAnswer } from './contact-mails';
import type { AnswerContactInput } from './contact-schema';
import { findContactBySecret, findMemberOfContact, updateContact } from './contacts-data';
import { findLiveLink } from './links-data';
import { findUserOfMember } from './overdue-data';
import { CONTACT_AUDIT, CONTACT_ERRORS } from './words/contact';

const dead = () => new AppError('not_found', CONTACT_ERRORS.dead);

/** By the link that asked, or by that of an overdue mail. */
async function findAsked(secret: string, now: number, from: ReadFrom) {
  const hash = hashSecret(secret);
  const asked = await findContactBySecret(hash, from);
  if (asked) return asked.contact.consentedAt !== null || asked.contact.expiresAt > now ? asked : null;
  const found = await findLiveLink(hash, now, from);
  if (found?.link.kind !== 'contact') return null;
  const userId = await findUserOfMember(found.memberId, from);
  return userId ? findMemberOfContact(userId, from) : null;
}

/** Keeps a contact's yes or no. A no later on ends what a yes began, and the member is told either way. */
export async function answerContact(input: AnswerContactInput, now: number): Promise<{ agreed: boolean }> {
  const agreed = input.answer === 'yes';
  return write(async (tx) => {
    const asked = await findAsked(input.secret, now, tx);
    if (!asked) throw dead();
    const { contact, member } = asked;
    if (agreed ? contact.consentedAt !== null : contact.declinedAt !== null) return { agreed };
    await updateContact(tx, member.id, {
      consentedAt: agreed ? now : null,
      declinedAt: agreed ? null : now,
      ...(agreed ? {} : { expiresAt: Math.max(contact.expiresAt, now + 24 * 3_600_000) }),
    });
    await mailContactAnswer(tx, member, contact, agreed, now);
    const summary = CONTACT_AUDIT.answered(member.name, agreed);
    await audit(
      tx,
      {
        clubId: null,
        actor: { userId: null, name: contact.name },
        action: 'account.contact_answered',
        subjectType: 'user',
        subjectId: member.id,
        summary,
      },
      now,
    );
    return { agreed };
  });
}

export interface ContactAsk {
  memberName: string;
  contactName: string;
  answer: 'yes' | 'no' | null;
}

/** What a contact's page shows; null when the link is unknown or too old. */
export async function readContactAsk(secret: string, now: number, from?: ReadFrom): Promise<ContactAsk | null> {
  const asked = await findContactBySecret(hashSecret(secret), from);
  if (!asked) return null;
  const { contact, member } = asked;
  if (contact.consentedAt === null && contact.expiresAt <= now) return null;
  const answer = contact.consentedAt !== null ? 'yes' : contact.declinedAt !== null ? 'no' : null;
  return { memberName: member.name, contactName: contact.name, answer };
}
