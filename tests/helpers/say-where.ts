import { afterEach } from 'vitest';
import { whereVisitorsAre } from './browser';

afterEach(async ({ task }) => {
  if (task.result?.state !== 'fail') return;
  for (const one of await whereVisitorsAre()) console.error(`When it failed: ${one}`);
});
