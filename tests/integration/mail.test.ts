import { execFile } from 'node:child_process';
import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { createClient } from '@libsql/client';
import { eq } from 'drizzle-orm';
import { drizzle } from 'drizzle-orm/libsql';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { beforeEach, describe, expect, inject, it } from 'vitest';
import type { MailMessage, MailPort, MailResult } from '@/adapters/mail/port';
import { reader, write } from '@/db/client';
import { auditLog, keptMail, outbox } from '@/db/schema';
import { listDeadMail, readMailState } from '@/features/mail/reads';
import { retryMail } from '@/features/mail/retry-mail';
import { sendDueMail } from '@/features/mail/send-due-mail';
import { setClock } from '@/server/clock';
import { queueMail } from '@/server/outbox';
import { addMember, makeClub, TEST_NOW } from '../helpers/make-club';

const MINUTE = 60_000;
const run = promisify(execFile);
let count = 0;
let at = TEST_NOW;

beforeEach(async () => {
  at = TEST_NOW;
  setClock(() => at);
  await write((tx) => tx.delete(outbox));
});

function queue(clubId: string | null = null, key = `key-${++count}`) {
  const mail = { clubId, kind: 'test', dedupeKey: key, to: { email: 'a@example.test', name: 'A' } };
  return write((tx) => queueMail(tx, { ...mail, subject: `Subject ${key}`, text: 'Secret link' }, at));
}

/** A mail service that answers as told and remembers what it was given. */
function portThat(answer: (message: MailMessage) => Promise<MailResult> | MailResult) {
  const given: MailMessage[] = [];
  const port: MailPort = {
    mode: 'smtp',
    async send(message) {
      given.push(message);
      return answer(message);
    },
  };
  return { port, given };
}

const accepted = (message: MailMessage): MailResult => ({ ok: true, messageId: message.id });
const refused = (permanent: boolean) => (): MailResult => ({ ok: false, permanent, message: 'mailbox trouble' });
const onlyRow = async () => {
  const [row] = await reader().select().from(outbox);
  if (!row) throw new Error('the outbox is empty');
  return row;
};

describe('sending', () => {
  it('keeps one mail for one key, sends it once and empties its words', async () => {
    expect(await queue(null, 'once')).toBe(true);
    expect(await queue(null, 'once')).toBe(false);
    const { port, given } = portThat(accepted);
    expect(await sendDueMail(at, port)).toEqual({ sent: 1, failed: 0 });
    expect(await sendDueMail(at, port)).toEqual({ sent: 0, failed: 0 });
    expect(given.map((message) => message.text)).toEqual(['Secret link']);
    expect(await onlyRow()).toMatchObject({ sentAt: at, message: null, leaseUntil: null });
  });

  it('tries again later after a passing trouble, under the same id, and gives up after eight', async () => {
    await queue();
    const { port, given } = portThat(refused(false));
    const waits: number[] = [];
    for (let tries = 0; tries < 8; tries++) {
      expect(await sendDueMail(at, port)).toEqual({ sent: 0, failed: 1 });
      const row = await onlyRow();
      if (row.deadAt !== null) break;
      waits.push((row.nextAttemptAt - at) / MINUTE);
      expect(await sendDueMail(row.nextAttemptAt - 1, port)).toEqual({ sent: 0, failed: 0 });
      at = row.nextAttemptAt;
    }
    expect(waits.slice(0, 5)).toEqual([1, 5, 15, 60, 240]);
    expect(given).toHaveLength(8);
    expect(new Set(given.map((message) => message.id)).size).toBe(1);
    expect(await onlyRow()).toMatchObject({ attempts: 8, deadAt: at, lastError: 'mailbox trouble' });
    expect(await sendDueMail(at + 1e9, port)).toEqual({ sent: 0, failed: 0 });
  });

  it('gives up at once when the refusal is for good', async () => {
    await queue();
    await sendDueMail(at, portThat(refused(true)).port);
    expect(await onlyRow()).toMatchObject({ attempts: 1, deadAt: at });
    expect(await readMailState()).toEqual({ mode: 'kept', waiting: 0, dead: 1 });
  });

  it('takes over from a process that died while sending, and stops a mail that ends every process', async () => {
    await queue();
    const { port, given } = portThat(() => Promise.reject(new Error('the process ends here')));
    for (let tries = 0; tries < 8; tries++) {
      await expect(sendDueMail(at, port)).rejects.toThrow('ends here');
      expect(await sendDueMail(at + MINUTE, port)).toEqual({ sent: 0, failed: 0 });
      at += 11 * MINUTE;
    }
    expect(await sendDueMail(at, portThat(accepted).port)).toEqual({ sent: 0, failed: 1 });
    expect(given).toHaveLength(8);
    expect(await onlyRow()).toMatchObject({ deadAt: at, sentAt: null });
  });

  it('leaves a mail sent when a slower sender of the same mail fails after it', async () => {
    await queue();
    const { port } = portThat(async () => {
      await sendDueMail(at + 11 * MINUTE, portThat(accepted).port);
      return refused(true)();
    });
    await sendDueMail(at, port);
    expect(await onlyRow()).toMatchObject({ deadAt: null, sentAt: expect.any(Number) });
  });

  it('keeps every mail readable where no server is set', async () => {
    await queue();
    expect(await sendDueMail(at)).toEqual({ sent: 1, failed: 0 });
    const row = await onlyRow();
    const kept = await reader().select().from(keptMail);
    expect(kept.at(-1)).toMatchObject({ text: 'Secret link', messageId: `<${row.id}@localhost>`, at });
  });
});

describe('dead letters', () => {
  it('are read and sent again by their own club only', async () => {
    const [club, other] = [await makeClub(), await makeClub()];
    const admin = await addMember(club, 'admin', { name: 'Admin' });
    const stranger = await addMember(other, 'admin');
    await queue(club.id);
    await sendDueMail(at, portThat(refused(true)).port);
    const [dead, ...more] = await listDeadMail(admin.scope);
    expect(more).toEqual([]);
    expect(dead).toMatchObject({ lastError: 'mailbox trouble', toName: 'A' });
    expect(dead).not.toHaveProperty('message');
    expect(await listDeadMail(stranger.scope)).toEqual([]);
    const id = dead?.id ?? '';
    await expect(retryMail(stranger.scope, { id }, at)).rejects.toMatchObject({ code: 'not_found' });
    await retryMail(admin.scope, { id }, at);
    await expect(retryMail(admin.scope, { id }, at)).rejects.toMatchObject({ code: 'not_found' });
    const { port, given } = portThat(accepted);
    expect(await sendDueMail(at, port)).toEqual({ sent: 1, failed: 0 });
    expect(given[0]?.id).toBe(id);
    const written = await reader().select().from(auditLog).where(eq(auditLog.subjectId, id));
    expect(written).toMatchObject([{ action: 'mail.retried', clubId: club.id, actorName: 'Admin' }]);
  });
});

it('three processes with two senders each deliver forty mails once each over SMTP', async () => {
  const folder = mkdtempSync(join(tmpdir(), 'windrest-mail-'));
  const file = join(folder, 'mail.db');
  copyFileSync(inject('templateDatabase'), file);
  const client = createClient({ url: `file:${file}` });
  const rows = Array.from({ length: 40 }, (_, index) => ({
    id: `mal_${index}`,
    kind: 'test',
    dedupeKey: `k${index}`,
    toEmail: `p${index}@example.test`,
    toName: `P ${index}`,
    subject: `Mail ${index}`,
    message: { text: `Words ${index}`, html: null, calendar: null, headers: {} },
    nextAttemptAt: at,
    createdAt: at,
  }));
  const own = drizzle(client, { casing: 'snake_case' });
  await own.insert(outbox).values(rows);
  const ids: (string | undefined)[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData: (stream, _session, done) => {
      simpleParser(stream).then((mail) => {
        ids.push(mail.messageId);
        done();
      }, done);
    },
  });
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  try {
    const address = server.server.address();
    const port = typeof address === 'object' && address ? address.port : 0;
    const env = {
      ...process.env,
      NODE_ENV: 'test' as const,
      DATABASE_URL: `file:${file}`,
      SMTP_URL: `smtp://127.0.0.1:${port}`,
    };
    const args = ['--import', 'tsx', '--conditions=react-server', 'tests/integration/mail-send-process.ts', String(at)];
    await Promise.all([1, 2, 3].map(() => run(process.execPath, args, { env })));
    expect(ids.sort()).toEqual(rows.map(({ id }) => `<${id}@localhost>`).sort());
    const left = await own.select().from(outbox);
    expect(left.filter((row) => row.sentAt === null || row.message !== null || row.attempts !== 1)).toEqual([]);
  } finally {
    client.close();
    await new Promise<void>((done) => server.close(done));
    rmSync(folder, { recursive: true, force: true });
  }
});
