import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { EnvironmentError, environmentSchema, readEnvironment } from './env';

const example = readFileSync('.env.example', 'utf8');

describe('the environment', () => {
  it('and .env.example name the same settings', () => {
    const named = [...example.matchAll(/^([A-Z_]+)=/gm)].map((found) => found[1]);
    expect(named.sort()).toEqual(Object.keys(environmentSchema.shape).sort());
  });

  it('needs nothing: a file database, made weather, kept mail', () => {
    expect(readEnvironment({})).toMatchObject({
      databaseUrl: 'file:data/windrest.db',
      weather: 'fake',
      smtpUrl: undefined,
      appUrl: 'http://127.0.0.1:3000',
    });
  });

  it('takes the example as it stands for no settings at all', () => {
    const lines = [...example.matchAll(/^([A-Z_]+)=(.*)$/gm)].map((found) => [found[1], found[2]]);
    expect(readEnvironment(Object.fromEntries(lines))).toEqual(readEnvironment({}));
  });

  it.each([
    [{ PORT: 'seventy' }, /PORT is "seventy"; write a port number/],
    [{ DATABASE_URL: 'mysql://x' }, /DATABASE_URL is "mysql:\/\/x"; write an address that starts with file:/],
    [{ WEATHER: 'sunny' }, /WEATHER is "sunny"; write fake, hosted or replay:FILE/],
    [{ DEV_PAGES: 'maybe' }, /DEV_PAGES is "maybe"; write 1 or 0/],
  ])('names a bad setting and what to write: %o', (source, words) => {
    expect(() => readEnvironment(source)).toThrow(EnvironmentError);
    expect(() => readEnvironment(source)).toThrow(words);
  });

  it('never opens the developer pages in production by itself', () => {
    expect(readEnvironment({ NODE_ENV: 'production' }).devPages).toBe(false);
    expect(readEnvironment({ NODE_ENV: 'production', DEV_PAGES: '1' }).devPages).toBe(true);
  });

  it('links without a slash at the end', () => {
    expect(readEnvironment({ APP_URL: 'https://club.example.org/' }).appUrl).toBe('https://club.example.org');
  });
});
