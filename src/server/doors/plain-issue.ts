import type { z } from 'zod';
import { PLAIN_ISSUE_WORDS } from '@/server/words';

/** Plain words where a schema gives none of its own: nobody should read "expected string, received undefined". */
export const plainIssue: z.core.$ZodErrorMap = (issue) => {
  if (issue.code === 'invalid_type')
    return issue.input === undefined ? PLAIN_ISSUE_WORDS.missing : PLAIN_ISSUE_WORDS.wrongForm;
  if (issue.code === 'invalid_value') return PLAIN_ISSUE_WORDS.notListed;
  if (issue.code === 'unrecognized_keys') return PLAIN_ISSUE_WORDS.more;
  if (issue.code === 'too_big')
    return issue.origin === 'string' ? PLAIN_ISSUE_WORDS.tooLong : PLAIN_ISSUE_WORDS.tooMuch;
  if (issue.code === 'too_small')
    return issue.origin === 'string' ? PLAIN_ISSUE_WORDS.tooShort : PLAIN_ISSUE_WORDS.tooLittle;
  return PLAIN_ISSUE_WORDS.other;
};
