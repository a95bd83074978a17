import { write } from '@/db/client';
import { deleteOldRuns } from '@/db/queries/job-runs';
import { deleteOldRates } from '@/db/queries/rate-limits';
import { remindUpkeep } from '@/features/chores/remind-upkeep';
import { deleteOldImports } from '@/features/exchange/imports-data';
import { remindLogs } from '@/features/logs/remind-logs';
import { sendDueMail } from '@/features/mail/send-due-mail';
import { deleteOldNoticeLinks } from '@/features/notices/choices-data';
import { deleteOldOutlooks } from '@/features/notices/outlooks-data';
import { remindEvening } from '@/features/notices/remind-evening';
import { sendWeekly } from '@/features/notices/send-weekly';
import { tellRested } from '@/features/notices/tell-rested';
import { tellRulesChanged } from '@/features/notices/tell-rules-changed';
import { tellWindTurned } from '@/features/notices/tell-wind-turned';
import { lapseUnsigned } from '@/features/outings/lapse-unsigned';
import { deleteOldLinks } from '@/features/outings/links-data';
import { tellOverdue } from '@/features/outings/tell-overdue';
import { removeOrphans } from '@/features/photos/remove-orphans';
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

/** Run one after the other these go from the most urgent; what they queue is mailed in the same round. */
export const JOBS: readonly Job[] = [
  {
    name: 'tell-overdue',
    everyMs: MINUTE,
    run: async (now) => {
      const { told } = await tellOverdue(now);
      return `${told} steps taken`;
    },
  },
  {
    name: 'lapse-unsigned',
    everyMs: MINUTE,
    run: async (now) => {
      const { lapsed } = await lapseUnsigned(now);
      return `${lapsed} lapsed`;
    },
  },
  {
    name: 'remind-logs',
    everyMs: 60 * MINUTE,
    run: async (now) => {
      const { reminded } = await remindLogs(now);
      return `${reminded} reminded`;
    },
  },
  {
    name: 'remind-upkeep',
    everyMs: 60 * MINUTE,
    run: async (now) => {
      const { reminded } = await remindUpkeep(now);
      return `${reminded} reminded`;
    },
  },
  {
    name: 'remind-evening',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { reminded } = await remindEvening(now);
      return `${reminded} reminded`;
    },
  },
  {
    name: 'tell-rested',
    everyMs: 30 * MINUTE,
    run: async (now) => {
      const { told } = await tellRested(now);
      return `${told} told`;
    },
  },
  {
    name: 'tell-rules-changed',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { told } = await tellRulesChanged(now);
      return `${told} told`;
    },
  },
  {
    name: 'send-weekly',
    everyMs: 30 * MINUTE,
    run: async (now) => {
      const { sent } = await sendWeekly(now);
      return `${sent} sent`;
    },
  },
  {
    name: 'tell-wind-turned',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { told } = await tellWindTurned(now);
      return `${told} told`;
    },
  },
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
    name: 'remove-orphans',
    everyMs: DAY,
    run: async (now) => {
      const { files, photos } = await removeOrphans(now);
      return `${files} files without a photo and ${photos} photos of what is gone removed`;
    },
  },
  {
    name: 'tidy',
    everyMs: DAY,
    run: async (now) => {
      await write(async (tx) => {
        await deleteOldRates(tx, now - DAY);
        await deleteOldRuns(tx, now - 2 * DAY);
        await deleteOldLinks(tx, now - 30 * DAY);
        await deleteOldImports(tx, now - 30 * DAY);
        await deleteOldNoticeLinks(tx, now - 365 * DAY);
        await deleteOldOutlooks(tx, now - 30 * DAY);
      });
      return 'old counts, runs, links and unused imports removed';
    },
  },
];
