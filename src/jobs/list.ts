import { write } from '@/db/client';
import { deleteOldRuns } from '@/db/queries/job-runs';
import { deleteOldRates } from '@/db/queries/rate-limits';
import { sendDueMail } from '@/features/mail/send-due-mail';
import { refreshAllForecasts } from '@/features/weather/refresh-all';

export interface Job {
  name: string;
  /** One run for each slot of this length, counted from the epoch. */
  everyMs: number;
  /** Says in a few words what it did. */
  run: (now: number) => Promise<string>;
}

const SECOND = 1000;
const MINUTE = 60 * SECOND;
const DAY = 24 * 60 * MINUTE;

export const JOBS: readonly Job[] = [
  {
    name: 'send-mail',
    everyMs: 5 * SECOND,
    run: async (now) => {
      const { sent, failed } = await sendDueMail(now);
      return `${sent} sent, ${failed} failed`;
    },
  },
  {
    name: 'refresh-forecasts',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { refreshed, failed } = await refreshAllForecasts(now);
      return `${refreshed} refreshed, ${failed} failed`;
    },
  },
  {
    name: 'tidy',
    everyMs: DAY,
    run: async (now) => {
      await write(async (tx) => {
        await deleteOldRates(tx, now - DAY);
        await deleteOldRuns(tx, now - 2 * DAY);
      });
      return 'old counts and runs removed';
    },
  },
];
