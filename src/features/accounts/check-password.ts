import { AppError } from '@/server/errors';
import { passwordProblem } from './password-rules';

/** Refuses a new password that its owner's name or address gives away; the form shows why beside the field. */
export function requireGoodPassword(password: string, owner: { email: string; name: string }): void {
  const problem = passwordProblem(password, owner);
  if (problem) throw new AppError('invalid', problem, { fields: { password: problem } });
}

export const spentLink = () =>
  new AppError('invalid', 'This link was used already or is too old. Ask for a new one, and open the newest mail.');
