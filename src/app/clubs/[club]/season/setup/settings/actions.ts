'use server';

import { saveSetupSettings } from '@/features/setup/save-settings';
import { makeSettingsSchema, settingsFormSchema } from '@/features/setup/settings-schema';
import { clubAction } from '@/server/doors';

export const saveSetupSettingsAction = clubAction({
  permission: 'features.write',
  input: settingsFormSchema,
  run: ({ scope, input, now }) => saveSetupSettings(scope, makeSettingsSchema(scope.club.units).parse(input), now),
});
