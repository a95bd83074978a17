import type { Page } from 'playwright-core';
import { DEMO_PASSWORD } from '@/features/demo/people';

/** Signs in by the form, as a person would. */
export async function signIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.locator('form[data-ready]').waitFor();
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL(/\/clubs/);
}

/** Signs in one of the demo's people. */
export function signInDemo(page: Page, key: string): Promise<void> {
  return signIn(page, `${key}@example.org`, DEMO_PASSWORD);
}
