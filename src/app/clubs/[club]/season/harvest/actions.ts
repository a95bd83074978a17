'use server';

import { atVersion } from '@/features/ground/action-inputs';
import { changeHarvestInput, harvestFormSchema, makeHarvestSchema } from '@/features/harvest/harvest-schema';
import { addHarvest, changeHarvest, removeHarvest } from '@/features/harvest/save-harvest';
import { clubAction } from '@/server/doors';

export const addHarvestAction = clubAction({
  permission: 'harvest.write',
  input: harvestFormSchema,
  run: ({ scope, input, now }) => addHarvest(scope, makeHarvestSchema(scope.club.units).parse(input), now),
});

export const changeHarvestAction = clubAction({
  permission: 'harvest.write',
  input: changeHarvestInput,
  run: ({ scope, input: { id, version, ...form }, now }) =>
    changeHarvest(scope, { id, version }, makeHarvestSchema(scope.club.units).parse(form), now),
});

export const removeHarvestAction = clubAction({
  permission: 'harvest.write',
  input: atVersion,
  run: ({ scope, input, now }) => removeHarvest(scope, input, now),
});
