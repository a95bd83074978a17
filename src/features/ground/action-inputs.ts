import { z } from 'zod';
import { isDay } from '@/core/day-time';
import { approachFormSchema } from './approach-schema';
import { featureFormSchema } from './feature-schema';
import { parkingFormSchema } from './parking-schema';
import { standFormSchema } from './stand-schema';
import { TYPED_FIELD_ERRORS } from './words/field-errors';

const id = z.string().min(1).max(40);
const version = z.number().int().positive();

/** A thing and the version that was open when somebody began to change it. */
export const atVersion = z.object({ id, version });

export const changeStandInput = standFormSchema.extend({ id, version });
export const changeFeatureInput = featureFormSchema.extend({ id, version });
export const changeParkingInput = parkingFormSchema.extend({ id, version });
export const addApproachInput = approachFormSchema.extend({ standId: id });
export const changeApproachInput = approachFormSchema.extend({ id, version });
export const openAgainInput = z.object({ id });

const day = z.string().refine(isDay, TYPED_FIELD_ERRORS.chooseADay);
export const touchedQuery = z.object({ standId: id.optional(), fromDay: day, toDay: day.optional() });
