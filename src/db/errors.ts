/** Drizzle wraps the driver's error: look through the causes. */
function* causes(error: unknown): Generator<Record<string, unknown>> {
  let at: unknown = error;
  for (let depth = 0; depth < 6 && typeof at === 'object' && at !== null; depth++) {
    const found = at as Record<string, unknown>;
    yield found;
    at = found.cause;
  }
}

function codeStarts(error: unknown, prefix: string): boolean {
  for (const cause of causes(error)) {
    for (const code of [cause.code, cause.extendedCode]) {
      if (typeof code === 'string' && code.startsWith(prefix)) return true;
    }
  }
  return false;
}

export function isBusy(error: unknown): boolean {
  return codeStarts(error, 'SQLITE_BUSY') || codeStarts(error, 'SQLITE_LOCKED');
}

export function isUniqueViolation(error: unknown): boolean {
  for (const cause of causes(error)) {
    if (cause.extendedCode === 'SQLITE_CONSTRAINT_UNIQUE' || cause.code === 'SQLITE_CONSTRAINT_UNIQUE') return true;
    if (typeof cause.message === 'string' && cause.message.includes('UNIQUE constraint failed')) return true;
  }
  return false;
}
