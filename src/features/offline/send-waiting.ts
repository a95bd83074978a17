import type { z } from 'zod';
import { logFormSchema } from '@/features/logs/log-schema';
import { visitFormSchema } from '@/features/logs/visit-schema';
import { signInSitSchema, signOutSitSchema } from '@/features/outings/outing-schema';
import type { ActionResult } from '@/server/doors';
import type { WaitingItem } from '@/ui/offline/waiting-store';
import { WAITING_ERRORS } from './words';

type Act<S extends z.ZodType> = (club: string, values: z.output<S>) => Promise<ActionResult<unknown>>;

/** The doors through which a waiting press goes, the same as one with a signal. */
export interface WaitingActions {
  signIn: Act<typeof signInSitSchema>;
  signOut: Act<typeof signOutSitSchema>;
  log: Act<typeof logFormSchema>;
  visit: Act<typeof visitFormSchema>;
}

const UNREADABLE: ActionResult<never> = {
  ok: false,
  error: { code: 'invalid', message: WAITING_ERRORS.unreadable },
};

async function pass<S extends z.ZodType>(schema: S, act: Act<S>, item: WaitingItem): Promise<ActionResult<unknown>> {
  const read = schema.safeParse(item.values);
  return read.success ? act(item.club, read.data) : UNREADABLE;
}

export function sendWaiting(actions: WaitingActions, item: WaitingItem): Promise<ActionResult<unknown>> {
  if (item.kind === 'sign_in') return pass(signInSitSchema, actions.signIn, item);
  if (item.kind === 'sign_out') return pass(signOutSitSchema, actions.signOut, item);
  if (item.kind === 'log') return pass(logFormSchema, actions.log, item);
  if (item.kind === 'visit') return pass(visitFormSchema, actions.visit, item);
  return Promise.resolve(UNREADABLE);
}
