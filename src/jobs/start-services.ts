import { env } from '@/env';
import { log } from '@/server/log';
import { startTicking } from './start-ticking';

export async function startServices(): Promise<void> {
  if (env.runJobs) startTicking();
  log.info({ weather: env.weather, mail: env.smtpUrl ? 'smtp' : 'kept', jobs: env.runJobs }, 'Windrest is up');
}
