import { z } from 'zod';

/** The one reader of the process environment. Each variable here stands in .env.example (a test compares them). */
const optional = z
  .string()
  .optional()
  .transform((text) => (text?.trim() ? text.trim() : undefined));

const flag = (fallback: boolean) =>
  optional.transform((text, ctx) => {
    if (text === undefined) return fallback;
    if (['1', 'true', 'yes', 'on'].includes(text.toLowerCase())) return true;
    if (['0', 'false', 'no', 'off'].includes(text.toLowerCase())) return false;
    ctx.addIssue({ code: 'custom', message: `is "${text}"; write 1 or 0` });
    return z.NEVER;
  });

const url = (protocols: string[]) =>
  optional.superRefine((text, ctx) => {
    if (text === undefined) return;
    const parsed = URL.canParse(text) ? new URL(text) : null;
    if (!parsed || !protocols.includes(parsed.protocol)) {
      ctx.addIssue({
        code: 'custom',
        message: `is "${text}"; write an address that starts with ${protocols.join(' or ')}`,
      });
    }
  });

const tiles = url(['http:', 'https:']).superRefine((text, ctx) => {
  if (text === undefined || ['{z}', '{x}', '{y}'].every((part) => text.includes(part))) return;
  ctx.addIssue({ code: 'custom', message: `is "${text}"; write an address that holds {z}, {x} and {y}` });
});

export const environmentSchema = z.object({
  NODE_ENV: optional,
  PORT: optional.transform((text, ctx) => {
    const port = Number(text ?? '3000');
    if (!Number.isInteger(port) || port < 1 || port > 65535) {
      ctx.addIssue({ code: 'custom', message: `is "${text}"; write a port number from 1 to 65535` });
      return z.NEVER;
    }
    return port;
  }),
  APP_URL: url(['http:', 'https:']),
  DATABASE_URL: url(['file:', 'libsql:', 'http:', 'https:']),
  DATABASE_TOKEN: optional,
  WEATHER: optional.superRefine((text, ctx) => {
    if (text === undefined || text === 'fake' || text === 'hosted' || /^replay:.+/.test(text)) return;
    ctx.addIssue({ code: 'custom', message: `is "${text}"; write fake, hosted or replay:FILE` });
  }),
  WEATHER_FORECAST_URL: url(['http:', 'https:']),
  WEATHER_ENSEMBLE_URL: url(['http:', 'https:']),
  WEATHER_ARCHIVE_URL: url(['http:', 'https:']),
  WEATHER_API_KEY: optional,
  ELEVATION: optional.superRefine((text, ctx) => {
    if (text === undefined || text === 'fake' || text === 'hosted') return;
    ctx.addIssue({ code: 'custom', message: `is "${text}"; write fake or hosted` });
  }),
  ELEVATION_URL: url(['http:', 'https:']),
  FILES_FOLDER: optional,
  FILES_BUCKET: optional,
  FILES_ENDPOINT: url(['http:', 'https:']),
  FILES_REGION: optional,
  FILES_ACCESS_KEY: optional,
  FILES_SECRET_KEY: optional,
  SMTP_URL: url(['smtp:', 'smtps:']),
  MAIL_FROM: optional,
  IMAGERY_URL: tiles,
  IMAGERY_ATTRIBUTION: optional,
  DEV_PAGES: flag(false),
  DEMO_SIGN_IN: flag(false),
  RUN_JOBS: flag(true),
  LOG_LEVEL: optional,
});

/** Files lie beside a database that is a file, else under data. */
function besideDatabase(databaseUrl: string | undefined): string {
  const file = databaseUrl?.startsWith('file:') ? databaseUrl.slice('file:'.length).split('?')[0] : undefined;
  const folder = file?.includes('/') ? file.slice(0, file.lastIndexOf('/')) : 'data';
  return `${folder}/files`;
}

export class EnvironmentError extends Error {}

export function readEnvironment(source: Record<string, string | undefined>) {
  const parsed = environmentSchema.safeParse(source);
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')} ${issue.message}`);
    throw new EnvironmentError(`These settings cannot be used:\n${lines.join('\n')}\nSee .env.example.`);
  }
  const set = parsed.data;
  if (set.FILES_BUCKET && !(set.FILES_ACCESS_KEY && set.FILES_SECRET_KEY)) {
    throw new EnvironmentError('FILES_BUCKET needs FILES_ACCESS_KEY and FILES_SECRET_KEY as well.\nSee .env.example.');
  }
  const production = set.NODE_ENV === 'production';
  return {
    production,
    port: set.PORT,
    appUrl: (set.APP_URL ?? `http://127.0.0.1:${set.PORT}`).replace(/\/$/, ''),
    databaseUrl: set.DATABASE_URL ?? 'file:data/windrest.db',
    databaseToken: set.DATABASE_TOKEN,
    weather: set.WEATHER ?? 'fake',
    weatherForecastUrl: set.WEATHER_FORECAST_URL,
    weatherEnsembleUrl: set.WEATHER_ENSEMBLE_URL,
    weatherArchiveUrl: set.WEATHER_ARCHIVE_URL,
    weatherApiKey: set.WEATHER_API_KEY,
    elevation: set.ELEVATION ?? 'fake',
    elevationUrl: set.ELEVATION_URL,
    filesFolder: set.FILES_FOLDER ?? besideDatabase(set.DATABASE_URL),
    /** None: files lie in the folder above. */
    s3: set.FILES_BUCKET
      ? {
          bucket: set.FILES_BUCKET,
          endpoint: set.FILES_ENDPOINT,
          region: set.FILES_REGION ?? 'us-east-1',
          accessKeyId: set.FILES_ACCESS_KEY ?? '',
          secretAccessKey: set.FILES_SECRET_KEY ?? '',
        }
      : null,
    /** None: the fake keeps every message in the database. */
    smtpUrl: set.SMTP_URL,
    mailFrom: set.MAIL_FROM ?? 'Windrest <windrest@localhost>',
    /** Tiles under the map; none: the map is drawn from the club's own data alone. */
    imagery: set.IMAGERY_URL ? { url: set.IMAGERY_URL, attribution: set.IMAGERY_ATTRIBUTION ?? '' } : null,
    /** Pages under /dev: the kept mail and the parts of the look. */
    devPages: set.DEV_PAGES || !production,
    /** The first page lets anyone into the demo club as one of its members. */
    demoSignIn: set.DEMO_SIGN_IN,
    runJobs: set.RUN_JOBS,
    logLevel: set.LOG_LEVEL ?? (set.NODE_ENV === 'test' ? 'silent' : 'info'),
  };
}

export type Environment = ReturnType<typeof readEnvironment>;

export const env: Environment = readEnvironment(process.env);
