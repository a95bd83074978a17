import { keepReads } from './keep-read';
import { readWeek } from './read-week';
import { readSits, type SitsAsk } from './reads';

/** The ranked list and the week as pages and polls read them: kept while nothing they hang on has changed. */
export const readKeptSits = keepReads((scope, ask: SitsAsk, now) => readSits(scope, ask, now));

export const readKeptWeek = keepReads((scope, ask: Pick<SitsAsk, 'weapon'>, now) => readWeek(scope, ask, now));
