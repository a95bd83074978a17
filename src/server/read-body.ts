import { AppError } from './errors';

/** The body of a request, given up as soon as it is more than it may be. */
export async function readBody(request: Request, most: number, tooMuch: string): Promise<Uint8Array> {
  const reader = request.body?.getReader();
  if (!reader) return new Uint8Array();
  const chunks: Uint8Array[] = [];
  let length = 0;
  for (let step = await reader.read(); !step.done; step = await reader.read()) {
    length += step.value.length;
    if (length > most) {
      await reader.cancel();
      throw new AppError('invalid', tooMuch);
    }
    chunks.push(step.value);
  }
  return Buffer.concat(chunks);
}
