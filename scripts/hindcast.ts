import { parseArgs } from 'node:util';
import { chooseWeather } from '@/adapters/weather/choose';
import { formatHindcast } from '@/core/format-hindcast';
import { closeDatabase } from '@/db/client';
import { env } from '@/env';
import { readHindcast } from '@/features/sits/read-hindcast';
import { systemScopeBySlug } from '@/server/scope';
import { needDatabase } from './need-database';

const HELP = `A season of observed wind over a club's stands: how often each could be sat, and which winds none covers.

  npm run hindcast -- --club SLUG --weather replay:FILE [--json]`;

try {
  const { values } = parseArgs({
    options: {
      club: { type: 'string' },
      weather: { type: 'string' },
      json: { type: 'boolean' },
      help: { type: 'boolean' },
    },
  });
  if (values.help || !values.club || !values.weather?.startsWith('replay:')) {
    console.log(HELP);
    process.exitCode = values.help ? 0 : 1;
  } else {
    await needDatabase();
    const scope = await systemScopeBySlug(values.club);
    const view = await readHindcast(scope, Date.now(), chooseWeather({ ...env, weather: values.weather }));
    console.log(
      values.json
        ? JSON.stringify(view, null, 2)
        : `${scope.club.name}, ${view.fromDay} to ${view.toDay}: ${view.source}\n\n${formatHindcast(view.hindcast)}`,
    );
  }
} catch (error) {
  // A wrong option and a refusal carry a code and plain words; anything else is a fault of the program.
  console.error(error instanceof Error && 'code' in error ? error.message : error);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
