import { SERVER_ERRORS } from '@/server/words';
/** The closed list of what can go wrong for a person. */
export const ERROR_CODES = [
  'signed_out',
  'forbidden',
  'not_found',
  'invalid',
  'conflict',
  'limit',
  'unavailable',
  'internal',
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];

export const HTTP_STATUS: Record<ErrorCode, number> = {
  signed_out: 401,
  forbidden: 403,
  not_found: 404,
  invalid: 400,
  conflict: 409,
  limit: 429,
  unavailable: 503,
  internal: 500,
};

/** Message by path of the field, such as `arcs.0.from`. */
export type FieldErrors = Record<string, string>;

export class AppError extends Error {
  constructor(
    readonly code: ErrorCode,
    /** For people: says what to do. */
    message: string,
    /** For the log and the form. */
    readonly more: { fields?: FieldErrors; log?: string; cause?: unknown } = {},
  ) {
    super(message, { cause: more.cause });
    this.name = 'AppError';
  }
}

export const notFound = () => new AppError('not_found', SERVER_ERRORS.notFound);

/** What a person is told of any error. */
export interface ErrorBody {
  code: ErrorCode;
  message: string;
  fields?: FieldErrors;
}
