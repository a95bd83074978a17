import { migrateDatabase } from '@/db/migrate';
import { env } from '@/env';

await migrateDatabase(env.databaseUrl);
console.log(`The database at ${env.databaseUrl} is up to date.`);
