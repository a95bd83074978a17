'use server';

import { atImport, saveImportInput } from '@/features/exchange/exchange-schema';
import { saveImport } from '@/features/exchange/save-import';
import { swapImport } from '@/features/exchange/swap-import';
import { undoImport } from '@/features/exchange/undo-import';
import { clubAction } from '@/server/doors';

export const saveImportAction = clubAction({
  permission: 'features.write',
  input: saveImportInput,
  run: ({ scope, input, now }) => saveImport(scope, input, now),
});

export const swapImportAction = clubAction({
  permission: 'features.write',
  input: atImport,
  run: ({ scope, input }) => swapImport(scope, input),
});

export const undoImportAction = clubAction({
  permission: 'features.write',
  input: atImport,
  run: ({ scope, input, now }) => undoImport(scope, input, now),
});
