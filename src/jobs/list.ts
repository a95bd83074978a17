import { write } from '@/db/client';
import { deleteOldRuns } from '@/db/queries/job-runs';
import { deleteOldRates } from '@/db/queries/rate-limits';
import { deleteOldSentRequests } from '@/db/queries/sent-requests';
import { remindUpkeep } from '@/features/chores/remind-upkeep';
import { deleteOldImports } from '@/features/exchange/imports-data';
import { keepPredictions } from '@/features/learning/keep-predictions';
import { remindLogs } from '@/features/logs/remind-logs';
import { deleteOldNoticeLinks } from '@/features/notices/choices-data';
import { deleteOldOutlooks } from '@/features/notices/outlooks-data';
import { remindEvening } from '@/features/notices/remind-evening';
import { sendWeekly } from '@/features/notices/send-weekly';
import { tellDraws } from '@/features/notices/tell-draws';
import { tellRested } from '@/features/notices/tell-rested';
import { tellRulesChanged } from '@/features/notices/tell-rules-changed';
import { tellWindTurned } from '@/features/notices/tell-wind-turned';
import { deleteOldLinks } from '@/features/outings/links-data';
import { removeOrphans } from '@/features/photos/remove-orphans';
import { refreshAllForecasts } from '@/features/weather/refresh-all';
import { DAY, type Job, MINUTE } from './job';
import { BOARD_JOBS, MAIL_JOB } from './urgent-jobs';
import { JOB_RESULTS } from './words';

/** A phone that lies in a drawer from one season to the next may still hold a press that was taken long ago. */
const SENT_KEPT_MS = 400 * DAY;

/** Run one after the other these go from the most urgent; what they queue is mailed in the same round. */
export const JOBS: readonly Job[] = [
  ...BOARD_JOBS,
  {
    name: 'keep-predictions',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { kept } = await keepPredictions(now);
      return JOB_RESULTS.kept(kept);
    },
  },
  {
    name: 'remind-logs',
    everyMs: 60 * MINUTE,
    run: async (now) => {
      const { reminded } = await remindLogs(now);
      return JOB_RESULTS.reminded(reminded);
    },
  },
  {
    name: 'remind-upkeep',
    everyMs: 60 * MINUTE,
    run: async (now) => {
      const { reminded } = await remindUpkeep(now);
      return JOB_RESULTS.reminded(reminded);
    },
  },
  {
    name: 'remind-evening',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { reminded } = await remindEvening(now);
      return JOB_RESULTS.reminded(reminded);
    },
  },
  {
    name: 'tell-rested',
    everyMs: 30 * MINUTE,
    run: async (now) => {
      const { told } = await tellRested(now);
      return JOB_RESULTS.told(told);
    },
  },
  {
    name: 'tell-rules-changed',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { told } = await tellRulesChanged(now);
      return JOB_RESULTS.told(told);
    },
  },
  {
    name: 'tell-draws',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { told } = await tellDraws(now);
      return JOB_RESULTS.told(told);
    },
  },
  {
    name: 'send-weekly',
    everyMs: 30 * MINUTE,
    run: async (now) => {
      const { sent } = await sendWeekly(now);
      return JOB_RESULTS.sent(sent);
    },
  },
  {
    name: 'tell-wind-turned',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { told } = await tellWindTurned(now);
      return JOB_RESULTS.told(told);
    },
  },
  MAIL_JOB,
  {
    name: 'refresh-forecasts',
    everyMs: 10 * MINUTE,
    run: async (now) => {
      const { refreshed, failed } = await refreshAllForecasts(now);
      return JOB_RESULTS.refreshed(refreshed, failed);
    },
  },
  {
    name: 'remove-orphans',
    everyMs: DAY,
    run: async (now) => {
      const { files, photos } = await removeOrphans(now);
      return JOB_RESULTS.orphans(files, photos);
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
        await deleteOldNoticeLinks(tx, now - 365 * DAY);
        await deleteOldOutlooks(tx, now - 30 * DAY);
        await deleteOldImports(tx, now - 30 * DAY);
        await deleteOldSentRequests(tx, now - SENT_KEPT_MS);
      });
      return JOB_RESULTS.tidied;
    },
  },
];
