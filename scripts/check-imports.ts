import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';

/** The import rule of DEVELOPERS.md: down and to the left only. Prints each line that breaks it and exits 1. */
const MAY_IMPORT: Record<string, string[]> = {
  app: ['features', 'server', 'core', 'lib', 'ui', 'env'],
  jobs: ['features', 'server', 'db', 'core', 'lib', 'env'],
  features: ['server', 'db', 'core', 'lib', 'ui', 'adapters', 'env'],
  server: ['db', 'core', 'lib', 'env'],
  db: ['core', 'lib', 'env'],
  adapters: ['core', 'lib', 'env'],
  ui: ['core', 'lib'],
  core: [],
  lib: [],
  env: [],
  instrumentation: ['jobs'],
  proxy: [],
};

/** Left to right: a feature imports only from those before it. */
const FEATURES = [
  'mail',
  'accounts',
  'clubs',
  'terrain',
  'ground',
  'map',
  'exchange',
  'weather',
  'bookings',
  'outings',
  'logs',
  'photos',
  'harvest',
  'chores',
  'sits',
  'draws',
  'coverage',
  'setup',
  'movement',
  'learning',
  'report',
  'moment',
  'board',
  'calendar',
  'notices',
  'offline',
  'onboarding',
  'demo',
];

const VENDOR_ONLY_IN_ADAPTERS = [
  'openmeteo',
  '@openmeteo/sdk',
  'flatbuffers',
  'msw',
  'nodemailer',
  '@aws-sdk/client-s3',
  'highs',
];
const CORE_MAY_USE = [
  'suncalc',
  'zod',
  '@date-fns/tz',
  'date-fns',
  'date-fns-tz',
  'geojson',
  '@photostructure/tz-lookup',
];
const IMPURE = [
  /\bDate\.now\b/,
  /\bnew Date\(\s*\)/,
  /\bMath\.random\b/,
  /\bprocess\./,
  /\bfetch\(/,
  /\bperformance\.now\b/,
  /from 'node:/,
];

const root = resolve(import.meta.dirname, '..');
const src = join(root, 'src');
const problems: string[] = [];

function* files(folder: string): Generator<string> {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) yield* files(path);
    else if (/\.tsx?$/.test(entry.name)) yield path;
  }
}

/** src/features/bookings/x.ts -> ['features', 'bookings', 'x'] */
function place(path: string): string[] {
  return relative(src, path)
    .replace(/\.tsx?$/, '')
    .split('/');
}

function checkImport(file: string, line: number, specifier: string): void {
  const say = (text: string) => problems.push(`${relative(root, file)}:${line}  ${text} (${specifier})`);
  if (specifier.endsWith('/package.json')) return;
  const [room = '', feature = ''] = place(file);
  // A test may use what it checks against, wherever that stands.
  if (/\.test\.tsx?$/.test(file)) return;
  const local = specifier.startsWith('@/')
    ? join(src, specifier.slice(2))
    : specifier.startsWith('.')
      ? resolve(dirname(file), specifier)
      : null;
  if (local) {
    const [toRoom = '', toFeature = ''] = place(local);
    if (toRoom !== room && !MAY_IMPORT[room]?.includes(toRoom)) say(`${room} may not import ${toRoom}`);
    if (room === 'features' && toRoom === 'features' && feature !== toFeature) {
      const [from, to] = [FEATURES.indexOf(feature), FEATURES.indexOf(toFeature)];
      if (from < 0 || to < 0) say('a feature that the order in scripts/check-imports.ts does not name');
      else if (to > from) say(`${feature} stands left of ${toFeature}`);
    }
    return;
  }
  const bare = specifier
    .split('/')
    .slice(0, specifier.startsWith('@') ? 2 : 1)
    .join('/');
  if (bare === 'drizzle-orm' && room !== 'db' && !/(^|[/-])data\.ts$/.test(file)) {
    say("drizzle is used only in src/db and a feature's data.ts");
  }
  if (VENDOR_ONLY_IN_ADAPTERS.includes(bare) && room !== 'adapters') say('a vendor SDK is used only in src/adapters');
  if (room === 'core' && !CORE_MAY_USE.includes(bare)) say('core is pure and may not use this');
}

for (const file of files(src)) {
  const [room] = place(file);
  readFileSync(file, 'utf8')
    .split('\n')
    .forEach((text, index) => {
      const line = index + 1;
      for (const found of text.matchAll(/(?:\bfrom|\bimport)\s*\(?\s*'([^']+)'/g))
        checkImport(file, line, found[1] ?? '');
      const code = text.replace(/\/\/.*$|^\s*\*.*$|\/\*.*\*\//g, '');
      if (/\bprocess\.env\b(?!\.NEXT_RUNTIME)/.test(code) && room !== 'env' && !/\.test\.tsx?$/.test(file)) {
        problems.push(`${relative(root, file)}:${line}  process.env is read only in src/env.ts`);
      }
      if (/import .*\buseQuery(Client)?\b.*'@tanstack/.test(code) && !file.endsWith('ui/query.ts')) {
        problems.push(`${relative(root, file)}:${line}  reads go through useRead and queryClient of @/ui/query`);
      }
      if (room === 'core' && !/\.test\.ts$/.test(file)) {
        for (const pattern of IMPURE) {
          if (pattern.test(code)) problems.push(`${relative(root, file)}:${line}  core is pure: ${pattern.source}`);
        }
      }
    });
}

if (problems.length > 0) {
  console.error(problems.join('\n'));
  console.error(`${problems.length} breaks of the import rule.`);
  process.exit(1);
}
console.log('The import rule holds.');
