'use server';

import { atVersion, changeFeatureInput, changeParkingInput } from '@/features/ground/action-inputs';
import { addFeature } from '@/features/ground/add-feature';
import { addParking } from '@/features/ground/add-parking';
import { changeFeature } from '@/features/ground/change-feature';
import { changeParking } from '@/features/ground/change-parking';
import { featureFormSchema, makeFeatureSchema } from '@/features/ground/feature-schema';
import { makeParkingSchema, parkingFormSchema } from '@/features/ground/parking-schema';
import { removeFeature } from '@/features/ground/remove-feature';
import { removeParking } from '@/features/ground/remove-parking';
import { drawingInput } from '@/features/map/drawing-schema';
import { saveDrawing } from '@/features/map/save-drawing';
import { clubAction } from '@/server/doors';

export const addFeatureAction = clubAction({
  permission: 'features.write',
  input: featureFormSchema,
  run: ({ scope, input, now }) => addFeature(scope, makeFeatureSchema(scope.club).parse(input), now),
});

export const changeFeatureAction = clubAction({
  permission: 'features.write',
  input: changeFeatureInput,
  run: ({ scope, input, now }) => changeFeature(scope, input, makeFeatureSchema(scope.club).parse(input), now),
});

export const removeFeatureAction = clubAction({
  permission: 'features.write',
  input: atVersion,
  run: ({ scope, input, now }) => removeFeature(scope, input, now),
});

export const addParkingAction = clubAction({
  permission: 'features.write',
  input: parkingFormSchema,
  run: ({ scope, input, now }) => addParking(scope, makeParkingSchema(scope.club).parse(input), now),
});

export const changeParkingAction = clubAction({
  permission: 'features.write',
  input: changeParkingInput,
  run: ({ scope, input, now }) => changeParking(scope, input, makeParkingSchema(scope.club).parse(input), now),
});

export const removeParkingAction = clubAction({
  permission: 'features.write',
  input: atVersion,
  run: ({ scope, input, now }) => removeParking(scope, input, now),
});

export const saveDrawingAction = clubAction({
  permission: 'features.write',
  input: drawingInput,
  run: ({ scope, input, now }) => saveDrawing(scope, input, now),
});
