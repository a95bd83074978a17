import type { z } from 'zod';

/** Plain words where a schema gives none of its own: nobody should read "expected string, received undefined". */
export const plainIssue: z.core.$ZodErrorMap = (issue) => {
  if (issue.code === 'invalid_type') return issue.input === undefined ? 'This is missing.' : 'This has the wrong form.';
  if (issue.code === 'invalid_value') return 'Choose one of the list.';
  if (issue.code === 'unrecognized_keys') return 'There is more here than was asked for.';
  if (issue.code === 'too_big') return issue.origin === 'string' ? 'This is too long.' : 'This is too much.';
  if (issue.code === 'too_small') return issue.origin === 'string' ? 'This is too short.' : 'This is too little.';
  return 'Look at this again.';
};
