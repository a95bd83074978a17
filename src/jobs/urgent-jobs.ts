import { sendDueMail } from '@/features/mail/send-due-mail';
import { lapseUnsigned } from '@/features/outings/lapse-unsigned';
import { tellOverdue } from '@/features/outings/tell-overdue';
import { type Job, MINUTE, SECOND } from './job';
import { JOB_RESULTS } from './words';

/** Those that somebody on the ground, or at the gate, waits for. */
export const BOARD_JOBS: readonly Job[] = [
  {
    name: 'tell-overdue',
    everyMs: MINUTE,
    run: async (now) => {
      const { told } = await tellOverdue(now);
      return JOB_RESULTS.steps(told);
    },
  },
  {
    name: 'lapse-unsigned',
    everyMs: MINUTE,
    run: async (now) => {
      const { lapsed } = await lapseUnsigned(now);
      return JOB_RESULTS.lapsed(lapsed);
    },
  },
];

export const MAIL_JOB: Job = {
  name: 'send-mail',
  everyMs: 5 * SECOND,
  run: async (now) => {
    const { sent, failed } = await sendDueMail(now);
    return JOB_RESULTS.mailed(sent, failed);
  },
};
