import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { newRequestKey } from './request-key';

describe('newRequestKey', () => {
  it('makes version 4 UUIDs (RFC 9562), no two alike', () => {
    const keys = Array.from({ length: 200 }, newRequestKey);
    for (const key of keys) expect(z.uuidv4().safeParse(key).success).toBe(true);
    expect(new Set(keys).size).toBe(200);
  });
});
