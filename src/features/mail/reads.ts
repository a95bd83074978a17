import { countMail } from '@/db/queries/outbox';
import { env } from '@/env';
import type { ClubScope } from '@/server/scope';
import { findKept, listDead, listKept } from './data';

/** The club's mail that could not be delivered, newest first. Its page asks for `mail.read`. */
export function listDeadMail(scope: ClubScope) {
  return listDead(scope);
}

export type DeadMail = Awaited<ReturnType<typeof listDeadMail>>[number];

/** For the health page: how mail leaves, and how much waits or was given up. */
export async function readMailState() {
  return { mode: env.smtpUrl ? ('smtp' as const) : ('kept' as const), ...(await countMail()) };
}

/** What the mail fake kept; nothing where the pages for developers are closed. */
export async function listKeptMail() {
  return env.devPages ? listKept() : [];
}

export async function readKeptMail(id: string) {
  return env.devPages ? findKept(id) : null;
}
