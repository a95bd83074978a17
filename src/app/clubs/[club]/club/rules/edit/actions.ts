'use server';

import { makeRulesSchema, rulesFormSchema } from '@/features/clubs/rules-form-schema';
import { saveRules } from '@/features/clubs/save-club';
import { clubAction } from '@/server/doors';

export const saveRulesAction = clubAction({
  permission: 'rules.write',
  input: rulesFormSchema,
  run: ({ scope, input, now }) => saveRules(scope, makeRulesSchema(scope.club.units).parse(input), now),
});
