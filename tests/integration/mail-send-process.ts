import { closeDatabase } from '@/db/client';
import { sendDueMail } from '@/features/mail/send-due-mail';

/** One of several processes that empty the same outbox; prints what it sent. */
const at = Number(process.argv[2]);
if (!Number.isFinite(at)) throw new Error('Give the instant.');
const runs = await Promise.all([sendDueMail(at), sendDueMail(at)]);
process.stdout.write(JSON.stringify(runs));
await closeDatabase();
