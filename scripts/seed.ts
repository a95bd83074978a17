import { parseArgs } from 'node:util';
import { closeDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { env } from '@/env';
import { demoSignIns } from '@/features/demo/demo-sign-ins';
import { seedDemo } from '@/features/demo/seed-demo';
import { now } from '@/server/clock';

const REFUSED = {
  not_local: 'The demo is written only into a local file (DATABASE_URL=file:...). Nothing was changed.',
  not_empty: 'This database is not empty, so the demo was left out. Nothing was changed.',
};

async function printDemoSignIns(): Promise<void> {
  const table = await demoSignIns();
  if (table) console.log(table);
}

const { values } = parseArgs({ options: { 'if-empty': { type: 'boolean' } } });
const local = env.databaseUrl.startsWith('file:');
if (local) await migrateDatabase(env.databaseUrl);
const result = await seedDemo(env.databaseUrl, now());
if (result === 'seeded') console.log('The demo club Tansy Fork is made.');
else if (!values['if-empty']) {
  console.error(REFUSED[result]);
  process.exitCode = 1;
}
if (local) await printDemoSignIns();
await closeDatabase();
