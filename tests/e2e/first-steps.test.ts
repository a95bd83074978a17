import { eq } from 'drizzle-orm';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { closeDatabase, useDatabase, write } from '@/db/client';
import { memberships, stands } from '@/db/schema';
import {
  allAxeFindings,
  axeFindings,
  DESKTOP,
  keepPicture,
  launchBrowser,
  newVisitor,
  PHONE,
} from '../helpers/browser';
import { DAY_PASSWORD, DAY_PEOPLE, DAY_SLUG, makeDayClub } from '../helpers/day-club';
import { type ServedApp, serveApp } from '../helpers/serve-app';
import { signIn } from '../helpers/sign-in';

let app: ServedApp;
let browser: Browser;

beforeAll(async () => {
  app = await serveApp({ seed: true, env: { DEMO_SIGN_IN: '1' } });
  await useDatabase(app.databaseUrl);
  await makeDayClub(Date.now());
  // A club as new as can be: no stand yet, and one admin.
  await write((tx) => tx.update(stands).set({ removedAt: Date.now() }).where(eq(stands.name, 'Oak Ladder')));
  await write((tx) => tx.update(stands).set({ removedAt: Date.now() }).where(eq(stands.name, 'Elm Box')));
  await write((tx) => tx.update(memberships).set({ role: 'admin' }).where(eq(memberships.role, 'steward')));
  browser = await launchBrowser();
});

afterAll(async () => {
  await browser?.close();
  await closeDatabase();
  await app?.stop();
});

describe('coming in for the first time', () => {
  it('tries the demo club as a member by one press', async () => {
    const { page, troubles } = await newVisitor(browser, app.url, PHONE);
    await page.goto('/');
    await page.getByRole('button', { name: 'Try the demo club' }).waitFor();
    expect(await allAxeFindings(page)).toEqual([]);
    await keepPicture(page, 'first-page');
    await page.getByRole('button', { name: 'Try the demo club' }).click();
    await page.waitForURL('**/clubs/tansy-fork/sit');
    await page.getByRole('region', { name: 'Stands by sit score' }).waitFor();
    expect(await page.getByRole('heading', { name: 'First steps' }).count()).toBe(0);
    expect(troubles).toEqual([]);
  });

  it('shows a new club its first steps, a list of samples at once, and takes them away again', async () => {
    const { page, troubles } = await newVisitor(browser, app.url, DESKTOP);
    await signIn(page, DAY_PEOPLE.officer.email, DAY_PASSWORD);
    await page.goto(`/clubs/${DAY_SLUG}/sit`);
    await page.getByRole('heading', { name: 'First steps' }).waitFor();
    expect(await allAxeFindings(page)).toEqual([]);
    await keepPicture(page, 'first-steps');
    await page.getByRole('button', { name: 'See a list with three sample stands' }).click();
    await page.getByText('Sample stands are on the list').waitFor();
    await page.getByText('Sample: ridge ladder').first().waitFor();
    expect(await axeFindings(page)).toEqual([]);
    await keepPicture(page, 'first-steps-samples');
    await page.getByRole('button', { name: 'Take the samples away' }).click();
    await page.getByText('No stands yet').waitFor();
    await page.getByRole('button', { name: 'Put these steps away' }).click();
    await page.getByRole('heading', { name: 'First steps' }).waitFor({ state: 'detached' });
    expect(troubles).toEqual([]);
  });
});
