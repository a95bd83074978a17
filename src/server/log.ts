import pino from 'pino';
import { env } from '@/env';

export const log = pino({
  level: env.logLevel,
  base: null,
  redact: ['password', '*.password', 'token', '*.token', 'secret', '*.secret', 'cookie', '*.cookie'],
});
