import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { reader, write } from '@/db/client';
import { insertAudit } from '@/db/queries/audit';
import { auditLog, rateLimits } from '@/db/schema';
import { takeRate } from '@/server/rate-limit';

const row = (key: string, count = 1) => ({ key, windowStartAt: 0, count });

describe('the write queue', () => {
  it('runs writes one after another and keeps all of them', async () => {
    await write((tx) => tx.insert(rateLimits).values(row('sum', 0)));
    await Promise.all(
      Array.from({ length: 40 }, () =>
        write(async (tx) => {
          const [now] = await tx.select().from(rateLimits).where(eq(rateLimits.key, 'sum'));
          await tx
            .update(rateLimits)
            .set({ count: (now?.count ?? 0) + 1 })
            .where(eq(rateLimits.key, 'sum'));
        }),
      ),
    );
    const [after] = await reader().select().from(rateLimits).where(eq(rateLimits.key, 'sum'));
    expect(after?.count).toBe(40);
  });

  it('leaves nothing of a change that fails, and goes on with the next', async () => {
    const failing = write(async (tx) => {
      await tx.insert(rateLimits).values(row('half'));
      throw new Error('stop here');
    });
    await expect(failing).rejects.toThrow('stop here');
    await write((tx) => tx.insert(rateLimits).values(row('whole')));
    const keys = (await reader().select().from(rateLimits)).map(({ key }) => key);
    expect(keys).toContain('whole');
    expect(keys).not.toContain('half');
  });

  it('refuses a write inside a write', async () => {
    const nested = write(async () => {
      await write(async () => undefined);
    });
    await expect(nested).rejects.toThrow(/pass the transaction on/);
  });
});

describe('the audit log', () => {
  it('is final: the database refuses to change or delete a row', async () => {
    const entry = {
      clubId: null,
      at: 1,
      actorUserId: null,
      actorName: 'A',
      action: 'x.y',
      subjectType: 'x',
      subjectId: '1',
    };
    await write((tx) => insertAudit(tx, { id: 'aud_final', ...entry, summary: 'as it was', detail: {} }));
    const change = write((tx) => tx.update(auditLog).set({ summary: 'otherwise' }));
    await expect(change).rejects.toThrow();
    await expect(write((tx) => tx.delete(auditLog))).rejects.toThrow();
    const [kept] = await reader().select().from(auditLog).where(eq(auditLog.id, 'aud_final'));
    expect(kept?.summary).toBe('as it was');
  });
});

describe('rate limits', () => {
  const rule = { name: 'try', most: 3, windowMs: 60_000 };

  it('count each subject, refuse past the most with the wait, and open again', async () => {
    for (let i = 0; i < 3; i++) await takeRate(rule, ['one'], 1000 + i);
    await expect(takeRate(rule, ['one'], 2000)).rejects.toMatchObject({ code: 'limit', message: /Wait 1 minute/ });
    await takeRate(rule, ['another'], 2000);
    await takeRate(rule, ['one'], 62_000);
  });
});
