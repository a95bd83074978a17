import { AppError } from '@/server/errors';
import { passwordProblem } from './password-rules';
import { ACCOUNT_ERRORS } from './words/errors';

/** Refuses a new password that its owner's name or address gives away; the form shows why beside the field. */
export function requireGoodPassword(password: string, owner: { email: string; name: string }): void {
  const problem = passwordProblem(password, owner);
  if (problem) throw new AppError('invalid', problem, { fields: { password: problem } });
}

export const spentLink = () => new AppError('invalid', ACCOUNT_ERRORS.spentLink);
