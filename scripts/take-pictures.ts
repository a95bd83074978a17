import { mkdirSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { parseArgs } from 'node:util';
import { LIGHT_COOKIE } from '@/ui/light';
import { DESKTOP, launchBrowser, newVisitor, PHONE } from '../tests/helpers/browser';
import { fillerOf, listPages } from '../tests/helpers/list-pages';
import { serveApp } from '../tests/helpers/serve-app';
import { signInDemo } from '../tests/helpers/sign-in';

/**
 * A picture of every page of the demo club on a phone and a desk in each light, from the built app.
 * npm run pictures -- [--into FOLDER] [--only TEXT] [--as nora|nobody] [--lights day,dark,dim] [--url http://127.0.0.1:3000 --database file:...]
 */
const { values } = parseArgs({
  options: {
    into: { type: 'string', default: join(tmpdir(), 'windrest-pictures') },
    only: { type: 'string', default: '' },
    as: { type: 'string', default: 'nora' },
    lights: { type: 'string', default: 'day,dark,dim' },
    url: { type: 'string' },
    database: { type: 'string' },
  },
});

const folder = resolve(values.into);
mkdirSync(folder, { recursive: true });
const own = values.url && values.database ? null : await serveApp({ seed: true });
const url = own?.url ?? values.url ?? '';
const browser = await launchBrowser();
let taken = 0;
try {
  const addressOf = await fillerOf(own?.databaseUrl ?? values.database ?? '', `${values.as}@example.org`);
  for (const size of [PHONE, DESKTOP]) {
    const { page, context } = await newVisitor(browser, url, size);
    await page.emulateMedia({ reducedMotion: 'reduce' });
    // A chosen light, so that the sun does not change it while a picture is taken.
    await context.addCookies([{ name: LIGHT_COOKIE, value: 'day', url }]);
    if (values.as !== 'nobody') await signInDemo(page, values.as);
    for (const path of listPages().filter((one) => one.includes(values.only))) {
      const address = addressOf(path);
      if (!address || (await page.goto(address))?.status() !== 200) continue;
      // What is kept ahead for when there is no signal may still be on its way: no part of the picture.
      await page.waitForLoadState('networkidle', { timeout: 10_000 }).catch(() => undefined);
      await page.evaluate(() => document.fonts.ready);
      for (const light of values.lights.split(',')) {
        await page.evaluate((name) => {
          document.documentElement.dataset.light = name;
        }, light);
        const name =
          path
            .replace('/clubs/[club]/', '')
            .replace(/[^\w-]+/g, '-')
            .replace(/^-|-$/g, '') || 'first';
        await page.screenshot({ path: join(folder, `${name}.${size.width}.${light}.png`), fullPage: true });
        taken += 1;
      }
    }
    await context.close();
  }
} finally {
  await browser.close();
  await own?.stop();
}
console.log(`${taken} pictures in ${folder}`);
