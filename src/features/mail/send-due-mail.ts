import type { MailPort, MailResult } from '@/adapters/mail/port';
import { write } from '@/db/client';
import { leaseDueMail, type OutboxRow, updateMail } from '@/db/queries/outbox';
import { now as clock } from '@/server/clock';
import { log } from '@/server/log';
import { MOST_ATTEMPTS, waitAfter } from './back-off';
import { settleLeased } from './data';
import { mailPort } from './mail-port';
import { MAIL_ERRORS } from './words';

const MINUTE = 60_000;
/** A batch at its slowest (ten timeouts of some 40 s) still ends inside its lease. */
const BATCH = 10;
const LEASE_MS = 10 * MINUTE;
const LONGEST_RUN_MS = 2 * MINUTE;

async function trySend(port: MailPort, row: OutboxRow): Promise<MailResult> {
  if (!row.message) return { ok: false, permanent: true, message: MAIL_ERRORS.noWords };
  // Leased once more than it may be tried: each try ended with its process.
  if (row.attempts > MOST_ATTEMPTS) return { ok: false, permanent: true, message: MAIL_ERRORS.stoppedProgram };
  const { id, toEmail, toName, subject, message } = row;
  return port.send({ id, to: { email: toEmail, name: toName }, subject, ...message });
}

async function settle(row: OutboxRow, result: MailResult, leaseUntil: number, at: number): Promise<void> {
  if (result.ok) {
    await write((tx) =>
      updateMail(tx, row.id, { sentAt: at, message: null, leaseUntil: null, deadAt: null, lastError: null }),
    );
    return;
  }
  const wait = result.permanent ? null : waitAfter(row.attempts);
  log.warn({ mail: row.id, kind: row.kind, attempts: row.attempts, dead: wait === null }, 'a mail was not sent');
  const fate = wait === null ? { deadAt: at } : { nextAttemptAt: at + wait };
  await write((tx) =>
    settleLeased(tx, row.id, leaseUntil, { ...fate, leaseUntil: null, lastError: result.message.slice(0, 300) }),
  );
}

/**
 * Sends what is due, outside any transaction. At least once: a process that dies between sending and marking leaves
 * the mail to be sent again under the same Message-ID.
 */
export async function sendDueMail(now: number, port: MailPort = mailPort()): Promise<{ sent: number; failed: number }> {
  const started = clock();
  const at = () => now + (clock() - started);
  const count = { sent: 0, failed: 0 };
  while (at() - now < LONGEST_RUN_MS) {
    const leaseUntil = at() + LEASE_MS;
    const rows = await write((tx) => leaseDueMail(tx, at(), leaseUntil, BATCH));
    for (const row of rows) {
      const result = await trySend(port, row);
      await settle(row, result, leaseUntil, at());
      count[result.ok ? 'sent' : 'failed'] += 1;
    }
    if (rows.length < BATCH) break;
  }
  return count;
}
