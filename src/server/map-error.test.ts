import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { AppError, ERROR_CODES, HTTP_STATUS } from './errors';
import { mapError } from './map-error';

describe('errors as people read them', () => {
  it('keeps the words and fields of an expected error and drops what is for the log', () => {
    const error = new AppError('conflict', 'Taken.', { fields: { day: 'Choose another.' }, log: 'row 7' });
    expect(mapError(error, 'test')).toEqual({
      code: 'conflict',
      message: 'Taken.',
      fields: { day: 'Choose another.' },
    });
  });

  it('puts each mistake of a form beside its field, the first one only', () => {
    const schema = z.object({
      name: z.string().min(1, 'Write a name.').regex(/^a/, 'Begin with a.'),
      at: z.object({ lat: z.number('Write a number.') }),
    });
    const { error } = schema.safeParse({ name: '', at: { lat: 'x' } });
    expect(mapError(error, 'test')).toMatchObject({
      code: 'invalid',
      fields: { name: 'Write a name.', 'at.lat': 'Write a number.' },
    });
  });

  it('knows a unique violation and a busy database through the wrapper of the query builder', () => {
    const wrapped = (cause: object) => Object.assign(new Error('Failed query: insert into sits values ...'), { cause });
    const unique = Object.assign(new Error('UNIQUE constraint failed: claims.stand_id'), {
      code: 'SQLITE_CONSTRAINT',
      extendedCode: 'SQLITE_CONSTRAINT_UNIQUE',
    });
    expect(mapError(wrapped(unique), 'test').code).toBe('conflict');
    expect(mapError(wrapped(Object.assign(new Error('locked'), { code: 'SQLITE_BUSY' })), 'test').code).toBe(
      'unavailable',
    );
  });

  it('tells nothing of an unexpected error', () => {
    const body = mapError(new Error('password=hunter2 in /srv/app'), 'test');
    expect(body.code).toBe('internal');
    expect(JSON.stringify(body)).not.toMatch(/hunter2|srv/);
  });

  it('has a status for every code', () => {
    for (const code of ERROR_CODES) expect(HTTP_STATUS[code]).toBeGreaterThanOrEqual(400);
  });
});
