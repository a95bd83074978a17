import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { reader, write } from '@/db/client';
import { jobRuns } from '@/db/schema';
import type { Job } from '@/jobs/job';
import { runDueJob, runDueJobs } from '@/jobs/run-due-jobs';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const NOON = Date.UTC(2026, 10, 7, 12);
/** A work that never ends, as that of a process that was killed. */
const FOREVER = new Promise<string>(() => undefined);

let runs: number;
const hourly = (run: (now: number) => Promise<string> = async () => `run ${++runs}`): Job => ({
  name: 'hourly',
  everyMs: HOUR,
  run,
});
const rows = () => reader().select().from(jobRuns);
const until = async (check: () => Promise<boolean>) => {
  while (!(await check())) await new Promise((done) => setImmediate(done));
};

beforeEach(async () => {
  runs = 0;
  await write((tx) => tx.delete(jobRuns));
});

describe('a job', () => {
  it('runs once a slot, whoever asks and however often', async () => {
    const asked = await Promise.all(Array.from({ length: 6 }, (_, n) => runDueJob(hourly(), NOON + n)));
    expect(asked.filter((outcome) => outcome !== null)).toEqual([
      { id: `hourly@${NOON}`, result: 'run 1', error: null },
    ]);
    expect(await runDueJob(hourly(), NOON + HOUR - 1)).toBeNull();
    expect((await runDueJob(hourly(), NOON + HOUR))?.result).toBe('run 2');
    expect(await rows()).toHaveLength(2);
  });

  it('is taken over when the lease of a process that was ended runs out, and not before', async () => {
    void runDueJob(
      hourly(() => FOREVER),
      NOON,
    );
    await until(async () => (await rows()).length === 1);
    expect(await runDueJob(hourly(), NOON + 5 * MINUTE - 1)).toBeNull();
    expect((await runDueJob(hourly(), NOON + 5 * MINUTE))?.result).toBe('run 1');
    expect(await rows()).toMatchObject([{ attempts: 2, result: 'run 1', leaseUntil: null }]);
  });

  it('keeps what the process that took over wrote when the slow one ends after all', async () => {
    let end: (said: string) => void = () => undefined;
    const slow = runDueJob(
      hourly(
        () =>
          new Promise((done) => {
            end = done;
          }),
      ),
      NOON,
    );
    await until(async () => (await rows()).length === 1);
    await runDueJob(hourly(), NOON + 6 * MINUTE);
    end('late');
    await slow;
    expect(await rows()).toMatchObject([{ result: 'run 1', finishedAt: NOON + 6 * MINUTE }]);
  });

  it('that fails shows its error, is tried again after a minute, and is let be after three tries', async () => {
    const failing = hourly(async () => {
      throw new Error(`broken ${++runs}`);
    });
    expect((await runDueJob(failing, NOON))?.error).toBe('broken 1');
    expect(await runDueJob(failing, NOON + MINUTE - 1)).toBeNull();
    expect((await runDueJob(failing, NOON + MINUTE))?.error).toBe('broken 2');
    expect((await runDueJob(failing, NOON + 2 * MINUTE))?.error).toBe('broken 3');
    expect(await runDueJob(failing, NOON + 30 * MINUTE)).toBeNull();
    const [row] = await reader()
      .select()
      .from(jobRuns)
      .where(eq(jobRuns.id, `hourly@${NOON}`));
    expect(row).toMatchObject({ attempts: 3, error: 'broken 3', finishedAt: NOON + 2 * MINUTE });
    expect((await runDueJob(hourly(), NOON + HOUR))?.error).toBeNull();
  });

  it('that recovers leaves no error behind', async () => {
    let broken = true;
    const job = hourly(async () => {
      if (broken) throw new Error('broken');
      return 'well';
    });
    await runDueJob(job, NOON);
    broken = false;
    expect((await runDueJob(job, NOON + MINUTE))?.result).toBe('well');
    expect(await rows()).toMatchObject([{ error: null, result: 'well', attempts: 2 }]);
  });

  it('that ends every process is not taken a fifth time', async () => {
    for (let tries = 0; tries < 4; tries++) {
      void runDueJob(
        hourly(() => FOREVER),
        NOON + tries * 5 * MINUTE,
      );
      await until(async () => (await rows())[0]?.attempts === tries + 1);
    }
    expect(await runDueJob(hourly(), NOON + 40 * MINUTE)).toBeNull();
  });
});

it('a job that fails stops none of those after it', async () => {
  const jobs: Job[] = [
    { name: 'first', everyMs: HOUR, run: async () => Promise.reject(new Error('no')) },
    { name: 'second', everyMs: HOUR, run: async () => 'yes' },
  ];
  expect(await runDueJobs(NOON, jobs)).toMatchObject([{ error: 'no' }, { result: 'yes' }]);
});
