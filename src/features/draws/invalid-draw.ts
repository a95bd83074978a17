import { AppError } from '@/server/errors';

export const invalidDraw = (field: string, message: string) =>
  new AppError('invalid', message, { fields: { [field]: message } });
