import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail, type MailParts } from '@/features/mail/compose';
import { newId } from '@/lib/ids';
import { queueMail } from '@/server/outbox';
import { issueLink } from './issue-link';
import { ACCOUNT_MAILS } from './words/mails';

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

const NOT_YOU = ACCOUNT_MAILS.notYou;

export async function mailVerifyLink(tx: Tx, user: Reader, now: number): Promise<void> {
  const { tokenId, url } = await issueLink(tx, user.id, 'verify_email', now);
  const words = {
    paragraphs: [ACCOUNT_MAILS.hello(user.name), ACCOUNT_MAILS.verifyOpening],
    button: { label: ACCOUNT_MAILS.verifyButton, url },
    after: [ACCOUNT_MAILS.verifyLasts, NOT_YOU],
  };
  await queue(tx, 'account.verify', tokenId, user, ACCOUNT_MAILS.verifySubject, words, now);
}

/** To the owner of an address that somebody signed up with again. */
export async function mailAccountExists(tx: Tx, user: Reader, now: number): Promise<void> {
  const words = {
    paragraphs: [ACCOUNT_MAILS.hello(user.name), ACCOUNT_MAILS.existsOpening],
    button: { label: ACCOUNT_MAILS.existsButton, url: `${env.appUrl}/sign-in` },
    after: [ACCOUNT_MAILS.existsForgotten(env.appUrl), NOT_YOU],
  };
  await queue(tx, 'account.exists', newId('mail'), user, ACCOUNT_MAILS.existsSubject, words, now);
}

/** The same for an address never confirmed: its owner chooses the password, whoever signed up first. */
export async function mailFinishAccount(tx: Tx, user: Reader, now: number): Promise<void> {
  const { tokenId, url } = await issueLink(tx, user.id, 'reset_password', now);
  const words = {
    paragraphs: ['Hello,', ACCOUNT_MAILS.finishOpening],
    button: { label: ACCOUNT_MAILS.finishButton, url },
    after: [ACCOUNT_MAILS.finishLasts, NOT_YOU],
  };
  await queue(tx, 'account.finish', tokenId, user, ACCOUNT_MAILS.finishSubject, words, now);
}

export async function mailResetLink(tx: Tx, user: Reader, now: number): Promise<void> {
  const { tokenId, url } = await issueLink(tx, user.id, 'reset_password', now);
  const words = {
    paragraphs: [ACCOUNT_MAILS.hello(user.name), ACCOUNT_MAILS.resetOpening],
    button: { label: ACCOUNT_MAILS.resetButton, url },
    after: [ACCOUNT_MAILS.resetLasts, NOT_YOU],
  };
  await queue(tx, 'account.reset', tokenId, user, ACCOUNT_MAILS.resetButton, words, now);
}

export async function mailPasswordChanged(tx: Tx, user: Reader, now: number): Promise<void> {
  const words = {
    paragraphs: [ACCOUNT_MAILS.hello(user.name), ACCOUNT_MAILS.changedOpening],
    button: { label: ACCOUNT_MAILS.changedButton, url: `${env.appUrl}/forgot` },
  };
  await queue(tx, 'account.password_changed', newId('mail'), user, ACCOUNT_MAILS.changedSubject, words, now);
}
