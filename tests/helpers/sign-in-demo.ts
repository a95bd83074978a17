import type { Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/features/demo/people';

/** Signs in one of the demo's people by the form, as a person would. */
export async function signInDemo(page: Page, key: string): Promise<void> {
  await page.goto('/sign-in');
  await page.locator('form[data-ready]').waitFor();
  await page.getByLabel('E-mail').fill(`${key}@example.org`);
  await page.getByLabel('Password').fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(/\/clubs/);
}
