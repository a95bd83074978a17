import { setTimeout as wait } from 'node:timers/promises';
import { closeDatabase } from '@/db/client';
import { JOBS } from '@/jobs/list';
import { runDueJobs } from '@/jobs/run-due-jobs';
import { needDatabase } from './need-database';

/** npm run jobs: once. npm run jobs -- --watch: until stopped. */
async function once(): Promise<void> {
  for (const { id, result, error } of await runDueJobs(Date.now(), JOBS)) console.log(`${id}  ${error ?? result}`);
}

await needDatabase();
let going = process.argv.includes('--watch');
process.on('SIGTERM', () => {
  going = false;
});
do {
  await once();
  if (going) await wait(2000);
} while (going);
await closeDatabase();
