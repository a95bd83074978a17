import { readAsk } from '@/features/sits/ask-schema';
import { WeekScreen } from '@/features/sits/components/week-screen';
import { readKeptWeek } from '@/features/sits/kept-reads';
import { WEEK_PAGE_WORDS } from '@/features/sits/words/week';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';

export const metadata = { title: WEEK_PAGE_WORDS.title };

export default clubPage('sits.read', async ({ scope, search }) => {
  const { weapon } = readAsk(search);
  return <WeekScreen key={weapon} ask={{ weapon }} view={await readKeptWeek(scope, { weapon }, now())} />;
});
