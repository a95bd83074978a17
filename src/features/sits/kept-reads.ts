import { hashSecret } from '@/lib/secrets';
import { keepReads } from './keep-read';
import { readWeek } from './read-week';
import { readSits, type SitsAsk } from './reads';
import type { KeptSitsView, KeptWeekView } from './view-types';

/** Whether two answers say the same, whenever they were made. */
function marked<T extends object>(view: T): T & { mark: string } {
  return { ...view, mark: hashSecret(JSON.stringify({ ...view, madeAt: 0 })).slice(0, 16) };
}

/** The ranked list and the week as pages and their later looks read them: kept while nothing they hang on has changed. */
export const readKeptSits = keepReads(
  async (scope, ask: SitsAsk, now): Promise<KeptSitsView> => marked(await readSits(scope, ask, now)),
);

export const readKeptWeek = keepReads(
  async (scope, ask: Pick<SitsAsk, 'weapon'>, now): Promise<KeptWeekView> => marked(await readWeek(scope, ask, now)),
);
