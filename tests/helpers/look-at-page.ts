import type { Page } from 'playwright-core';
import { allAxeFindings, DESKTOP, PHONE } from './browser';

/** A phone of 390 px, the same at 200 % zoom or near it, and a desk. */
const ZOOMED = { width: 320, height: 700 };

/** What reaches past the right edge of a page that grew wider than its window; '' when none did. */
async function overflow(page: Page): Promise<string> {
  return page.evaluate(() => {
    const room = document.documentElement.clientWidth;
    const width = document.documentElement.scrollWidth;
    if (width <= room) return '';
    const past = [...document.querySelectorAll('body *')].filter((one) => one.getBoundingClientRect().right > room + 1);
    const names = past.slice(-3).map((one) => `${one.tagName.toLowerCase()}.${one.getAttribute('class') ?? ''}`);
    return `grew to ${width} px; past the edge: ${names.join(' | ')}`;
  });
}

/** Changes the light and waits until the new colours are drawn: colours half way are nobody's fault. */
async function inLight(page: Page, light: 'day' | 'dark' | 'dim'): Promise<void> {
  await page.evaluate(async (name) => {
    document.documentElement.dataset.light = name;
    for (const _ of [1, 2]) await new Promise((drawn) => requestAnimationFrame(drawn));
    await Promise.allSettled(document.getAnimations().map((moving) => moving.finished));
  }, light);
}

/**
 * Everything axe and a ruler find wrong with the page as it stands, in the three lights and at three widths. `brief`: on a
 * phone only, for people who see less of a page that another was shown in full.
 */
export async function lookAtPage(page: Page, brief: boolean): Promise<string[]> {
  const found: string[] = [];
  const note = (where: string, texts: string[]) => found.push(...texts.map((text) => `${where}: ${text}`));
  for (const size of [PHONE, DESKTOP]) {
    await page.setViewportSize(size);
    const wide = await overflow(page);
    if (wide) note(`${size.width} px`, [wide]);
    if (brief && size !== PHONE) continue;
    await inLight(page, 'day');
    note(`${size.width} px, day`, texts(await allAxeFindings(page)));
    // Light changes colours alone: one rule looks at them.
    for (const light of ['dark', 'dim'] as const) {
      await inLight(page, light);
      note(`${size.width} px, ${light}`, texts(await allAxeFindings(page, ['color-contrast'])));
    }
  }
  await page.setViewportSize(ZOOMED);
  const wide = await overflow(page);
  if (wide) note(`${ZOOMED.width} px`, [wide]);
  return found;
}

const texts = (findings: { impact: string; text: string }[]) => findings.map((one) => `${one.impact} ${one.text}`);
