import { parseArgs } from 'node:util';
import { chooseWeather } from '@/adapters/weather/choose';
import { WINDOW_NAMES } from '@/core/condition-types';
import { isDay } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import { sitWindow } from '@/core/windows';
import { closeDatabase } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { forecastFrom } from '@/features/sits/load-forecast';
import { printSits } from '@/features/sits/print-sits';
import { askedWindow, type ReadOptions, readSits } from '@/features/sits/reads';
import { systemScopeBySlug } from '@/server/scope';
import { needDatabase } from './need-database';

const HELP = `The ranked list of a window, as the Sit screen reads it.

  npm run sits -- --list-clubs
  npm run sits -- --club SLUG [--day YYYY-MM-DD] [--window morning|evening] [--weapon bow] [--now INSTANT]
                  [--weather fake|hosted|replay:FILE] [--rules] [--json]

With a replay the hours of FILE count as forecast twelve hours before the window (or at --now), and the rules of booking are
left out, since today's bookings and seasons say nothing of a past day; --rules applies them all the same.`;

const HOUR_MS = 3_600_000;
const REPLAY_LEAD_MS = 12 * HOUR_MS;

class Usage extends Error {}

function oneOf<T extends string>(name: string, text: string | undefined, all: readonly T[]): T | undefined {
  if (text === undefined) return undefined;
  const found = all.find((one) => one === text);
  if (!found) throw new Usage(`--${name} is "${text}"; write ${all.join(' or ')}.`);
  return found;
}

function instant(text: string): number {
  const at = Date.parse(text);
  if (Number.isNaN(at)) throw new Usage(`--now is "${text}"; write an instant as 2013-11-09T12:00:00Z.`);
  return at;
}

async function main(): Promise<void> {
  const { values } = parseArgs({
    options: {
      club: { type: 'string' },
      day: { type: 'string' },
      window: { type: 'string' },
      weapon: { type: 'string' },
      weather: { type: 'string' },
      now: { type: 'string' },
      rules: { type: 'boolean' },
      json: { type: 'boolean' },
      'list-clubs': { type: 'boolean' },
      help: { type: 'boolean' },
    },
  });
  if (values.help) return console.log(HELP);
  if (values['list-clubs']) {
    await needDatabase();
    const clubs = await listClubs();
    for (const club of clubs) console.log(`${club.slug}  ${club.name}  ${club.zone}`);
    if (clubs.length === 0) console.log('No clubs yet. npm run db:seed makes the demo club.');
    return;
  }
  if (!values.club) throw new Usage('Name a club with --club SLUG, or see them with --list-clubs.');
  if (values.day !== undefined && !isDay(values.day)) throw new Usage(`--day is "${values.day}"; write YYYY-MM-DD.`);
  const weather = values.weather ?? env.weather;
  if (!/^(fake|hosted|replay:.+)$/.test(weather)) {
    throw new Usage(`--weather is "${weather}"; write fake, hosted or replay:FILE.`);
  }
  const window = oneOf('window', values.window, WINDOW_NAMES);
  const ask = { day: values.day, window, weapon: oneOf('weapon', values.weapon, WEAPONS) };
  await needDatabase();
  const scope = await systemScopeBySlug(values.club);
  const replay = weather.startsWith('replay:');
  if (replay && !ask.day) throw new Usage('A replay needs --day.');
  const asked = askedWindow(scope, ask, Date.now());
  const { startAt } = sitWindow(asked.day, asked.window, scope.club.rules, scope.club);
  const now = values.now ? instant(values.now) : replay ? startAt - REPLAY_LEAD_MS : Date.now();
  const options: ReadOptions = { rules: replay && !values.rules ? 'leave_out' : 'apply' };
  if (values.weather) {
    const port = chooseWeather({ ...env, weather }, { now: () => now, issuedAt: () => now });
    options.forecast = await forecastFrom(port, scope);
  }
  const view = await readSits(scope, { ...ask, day: asked.day, window: asked.window }, now, options);
  console.log(values.json ? JSON.stringify(view, null, 2) : printSits(view));
}

try {
  await main();
} catch (error) {
  const known = error instanceof Usage || (error instanceof Error && 'code' in error);
  console.error(known ? error.message : error);
  if (error instanceof Usage) console.error(`\n${HELP}`);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
// The made weather's own server would keep the process open.
process.exit();
