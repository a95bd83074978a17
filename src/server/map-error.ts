import { z } from 'zod';
import { isBusy, isUniqueViolation } from '@/db/errors';
import { SERVER_ERRORS } from '@/server/words';
import { AppError, type ErrorBody, type FieldErrors } from './errors';
import { log } from './log';

function fieldsOf(error: z.ZodError): FieldErrors {
  const fields: FieldErrors = {};
  for (const issue of error.issues) {
    const path = issue.path.join('.');
    fields[path] ??= issue.message;
  }
  return fields;
}

/** The one place where an error becomes what a person reads; what nobody expected goes to the log whole. */
export function mapError(error: unknown, where: string): ErrorBody {
  if (error instanceof AppError) {
    if (error.more.log) log.warn({ where, code: error.code, detail: error.more.log }, error.message);
    return { code: error.code, message: error.message, ...(error.more.fields ? { fields: error.more.fields } : {}) };
  }
  if (error instanceof z.ZodError) {
    const fields = fieldsOf(error);
    const first = Object.values(fields)[0] ?? SERVER_ERRORS.form;
    return {
      code: 'invalid',
      message: Object.keys(fields).length > 1 ? SERVER_ERRORS.entries : first,
      fields,
    };
  }
  if (isUniqueViolation(error)) {
    log.warn({ where, err: error }, 'unique violation');
    return { code: 'conflict', message: SERVER_ERRORS.quicker };
  }
  if (isBusy(error)) {
    log.error({ where, err: error }, 'database busy');
    return { code: 'unavailable', message: SERVER_ERRORS.busy };
  }
  log.error({ where, err: error }, 'unexpected error');
  return { code: 'internal', message: SERVER_ERRORS.internal };
}
