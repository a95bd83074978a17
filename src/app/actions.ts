'use server';

import { z } from 'zod';
import { env } from '@/env';
import { takeDemoRate } from '@/features/accounts/rates';
import { findDemoMember } from '@/features/demo/find-demo-member';
import { publicAction } from '@/server/doors';
import { notFound } from '@/server/errors';
import { requestSource, startSession } from '@/server/session';

export const demoSignInAction = publicAction({
  input: z.object({}),
  run: async ({ now }) => {
    if (!env.demoSignIn) throw notFound();
    await takeDemoRate((await requestSource()).address, now);
    const demo = await findDemoMember();
    await startSession(demo.userId);
    return { to: `/clubs/${demo.slug}/sit` };
  },
});
