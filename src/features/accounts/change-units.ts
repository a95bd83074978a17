import { write } from '@/db/client';
import type { ChangeUnitsInput } from './account-schema';
import { auditAccount } from './audit-account';
import { updateUser } from './data';
import { ACCOUNT_AUDIT } from './words/audit';

/** How figures are shown to one person; what is stored and what others see stays as it is. */
export async function changeUnits(
  user: { id: string; name: string },
  { units }: ChangeUnitsInput,
  now: number,
): Promise<void> {
  await write(async (tx) => {
    await updateUser(tx, user.id, { units: units === 'club' ? null : units });
    await auditAccount(tx, user, 'units_chosen', ACCOUNT_AUDIT.unitsChosen[units](user.name), now);
  });
}
