import { write } from '@/db/client';
import type { ChangeNameInput } from './account-schema';
import { auditAccount } from './audit-account';
import { updateUser } from './data';
import { ACCOUNT_AUDIT } from './words/audit';

export async function changeName(
  user: { id: string; name: string },
  input: ChangeNameInput,
  now: number,
): Promise<void> {
  await write(async (tx) => {
    await updateUser(tx, user.id, { name: input.name });
    await auditAccount(tx, user, 'renamed', ACCOUNT_AUDIT.nameChanged(user.name, input.name), now);
  });
}
