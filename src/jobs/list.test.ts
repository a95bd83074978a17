import { describe, expect, it } from 'vitest';
import { JOB_TITLES } from '@/features/clubs/words/jobs';
import { JOBS } from './list';

describe('the list of jobs', () => {
  it('has a title in plain words for each, and none for what is gone', () => {
    expect(Object.keys(JOB_TITLES).sort()).toEqual(JOBS.map((job) => job.name).sort());
  });

  it('names each once', () => {
    expect(new Set(JOBS.map((job) => job.name)).size).toBe(JOBS.length);
  });
});
