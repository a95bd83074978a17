import type { Page } from 'playwright-core';
import { expect } from 'vitest';

export interface NewPerson {
  name: string;
  email: string;
  password: string;
}

/** The newest kept mail that lets a new account in; the mail job may take a moment. */
async function confirmByMail(page: Page, person: NewPerson): Promise<void> {
  const row = page
    .getByRole('row')
    .filter({ hasText: person.email })
    .getByRole('link', { name: /confirm/i });
  await expect
    .poll(
      async () => {
        await page.goto('/dev/mail');
        return row.count();
      },
      { timeout: 60_000 },
    )
    .toBeGreaterThan(0);
  await row.first().click();
  await page.getByRole('heading', { name: 'Plain text' }).waitFor();
  await page.locator('a[href^="http"]').filter({ hasText: '/' }).first().click();
  await page.getByLabel('Password').fill(person.password);
  await page.getByRole('button', { name: 'Confirm and sign in' }).click();
  await page.waitForURL(/\/clubs/);
}

export async function startClub(page: Page, name: string): Promise<void> {
  await page.goto('/clubs/new');
  await page.getByLabel('Name of the club').fill(name);
  await page.getByLabel('Latitude').fill('41.2');
  await page.getByLabel('Longitude').fill('-77.3');
  await page.getByLabel('Longitude').blur();
  await expect.poll(() => page.getByLabel('Time zone').inputValue()).toBe('America/New_York');
  await page.getByRole('button', { name: 'Start the club' }).click();
  await page.waitForURL(new RegExp(`/clubs/${name.toLowerCase().replaceAll(' ', '-')}`));
}

/** A new account by the form, confirmed from the kept mail. */
export async function makeAccount(page: Page, person: NewPerson): Promise<void> {
  await page.goto('/sign-up');
  await page.getByLabel('Your name').fill(person.name);
  await page.getByLabel('E-mail').fill(person.email);
  await page.getByLabel('Password').fill(person.password);
  await page.getByRole('button', { name: 'Make the account' }).click();
  await page.getByText('We wrote to').waitFor();
  await confirmByMail(page, person);
}
