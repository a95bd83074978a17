import { isMigrated } from '@/db/check-migrated';
import { env } from '@/env';

/** Ends the tool with one line of what to do where its database is missing, behind this version, or cannot be opened. */
export async function needDatabase(): Promise<void> {
  const url = env.databaseUrl;
  let problem: string | null = null;
  try {
    if (await isMigrated(url)) return;
  } catch (error) {
    problem = error instanceof Error ? (error.message.split('\n')[0] ?? '') : String(error);
  }
  console.error(
    problem === null
      ? `The database at ${url} is missing or not up to date: run npm run db:migrate, then try again.`
      : `The database at ${url} cannot be opened (${problem}): look at DATABASE_URL, then try again.`,
  );
  process.exit(1);
}
