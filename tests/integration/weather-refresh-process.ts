import { closeDatabase } from '@/db/client';
import { refreshForecast } from '@/features/weather/refresh-forecast';

/** One of several processes that all want the same forecast at once; prints what came of each try. */
const [at, lat, lon] = process.argv.slice(2).map(Number);
if (at === undefined || lat === undefined || lon === undefined)
  throw new Error('Give the instant, latitude and longitude.');
const outcomes = await Promise.all(Array.from({ length: 10 }, () => refreshForecast({ lat, lon }, at)));
process.stdout.write(JSON.stringify(outcomes.map(({ status }) => status)));
await closeDatabase();
