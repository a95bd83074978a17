import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail, type MailParts } from '@/features/mail/compose';
import { newId } from '@/lib/ids';
import { queueMail } from '@/server/outbox';
import { issueLink } from './issue-link';

interface Reader {
  id: string;
  email: string;
  name: string;
}

type Words = Omit<MailParts, 'clubName'>;

async function queue(tx: Tx, kind: string, key: string, to: Reader, subject: string, words: Words, now: number) {
  const { text, html } = composeMail({ ...words, clubName: null });
  const person = { email: to.email, name: to.name };
  await queueMail(tx, { clubId: null, kind, dedupeKey: `${kind}:${key}`, to: person, subject, text, html }, now);
}

const NOT_YOU = 'If this was not you, leave this mail alone: nothing happens.';

export async function mailVerifyLink(tx: Tx, user: Reader, now: number): Promise<void> {
  const { tokenId, url } = await issueLink(tx, user.id, 'verify_email', now);
  const words = {
    paragraphs: [`Hello ${user.name},`, 'One step is left: confirm that this e-mail address is yours.'],
    button: { label: 'Confirm and sign in', url },
    after: ['The link works once, for 48 hours.', NOT_YOU],
  };
  await queue(tx, 'account.verify', tokenId, user, 'Confirm your e-mail address', words, now);
}

/** To the owner of an address that somebody signed up with again. */
export async function mailAccountExists(tx: Tx, user: Reader, now: number): Promise<void> {
  const words = {
    paragraphs: [
      `Hello ${user.name},`,
      'Somebody, perhaps you, asked for a new account with this e-mail address. You already have one: sign in with it.',
    ],
    button: { label: 'Sign in', url: `${env.appUrl}/sign-in` },
    after: [`Password forgotten? Choose a new one at ${env.appUrl}/forgot`, NOT_YOU],
  };
  await queue(tx, 'account.exists', newId('mail'), user, 'You already have an account', words, now);
}

/** The same for an address never confirmed: its owner chooses the password, whoever signed up first. */
export async function mailFinishAccount(tx: Tx, user: Reader, now: number): Promise<void> {
  const { tokenId, url } = await issueLink(tx, user.id, 'reset_password', now);
  const words = {
    paragraphs: [
      'Hello,',
      'An account with this e-mail address was begun earlier and never finished. Choose a password to finish it.',
    ],
    button: { label: 'Choose a password', url },
    after: ['The link works once, for one hour.', NOT_YOU],
  };
  await queue(tx, 'account.finish', tokenId, user, 'Finish your account', words, now);
}

export async function mailResetLink(tx: Tx, user: Reader, now: number): Promise<void> {
  const { tokenId, url } = await issueLink(tx, user.id, 'reset_password', now);
  const words = {
    paragraphs: [`Hello ${user.name},`, 'Here is the link to choose a new password.'],
    button: { label: 'Choose a new password', url },
    after: ['The link works once, for one hour. Choosing a new password signs you out everywhere.', NOT_YOU],
  };
  await queue(tx, 'account.reset', tokenId, user, 'Choose a new password', words, now);
}

export async function mailPasswordChanged(tx: Tx, user: Reader, now: number): Promise<void> {
  const words = {
    paragraphs: [`Hello ${user.name},`, 'Your password was changed, and other browsers were signed out.'],
    button: { label: 'This was not me: choose a new password', url: `${env.appUrl}/forgot` },
  };
  await queue(tx, 'account.password_changed', newId('mail'), user, 'Your password was changed', words, now);
}
