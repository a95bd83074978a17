import type { Locator, Page } from 'playwright-core';
import type { Visitor } from './browser';

/** The ground screen of a club, open in a browser. */
export interface Ground {
  page: Page;
  map: Locator;
  /** Taps the map at shares of its width and height. */
  tap: (x: number, y: number) => Promise<void>;
  drag: (from: [number, number], to: [number, number]) => Promise<void>;
  draw: (kind: string) => Promise<void>;
  list: (group: string) => Locator;
  name: Locator;
}

export async function openGround({ page }: Visitor, club: string, touch: boolean): Promise<Ground> {
  await page.goto(`/clubs/${club}/ground`);
  const map = page.getByRole('application', { name: /^Map of/ });
  await map.waitFor();
  const spotOf = async (x: number, y: number): Promise<[number, number]> => {
    const box = await map.boundingBox();
    if (!box) throw new Error('The map has no size.');
    return [box.x + box.width * x, box.y + box.height * y];
  };
  const middle = () => map.evaluate((element) => element.scrollIntoView({ block: 'center' }));
  return {
    page,
    map,
    name: page.getByRole('textbox', { name: 'Name' }),
    list: (group) => page.getByRole('list', { name: group, exact: true }).getByRole('button'),
    draw: async (kind) => {
      await page.getByLabel('Add', { exact: true }).selectOption(kind);
      await page.getByRole('button', { name: 'Draw it' }).click();
      await page.getByRole('button', { name: 'Cancel' }).waitFor();
      await middle();
    },
    drag: async (from, to) => {
      await page.mouse.move(...(await spotOf(...from)));
      await page.mouse.down();
      await page.mouse.move(...(await spotOf(...to)), { steps: 8 });
      await page.mouse.up();
    },
    tap: async (x, y) => {
      const at = await spotOf(x, y);
      if (touch) await page.touchscreen.tap(...at);
      else await page.mouse.click(...at);
    },
  };
}

export async function drawPoint(ground: Ground, kind: string, at: [number, number], name: string): Promise<void> {
  await ground.draw(kind);
  await ground.tap(...at);
  await ground.name.waitFor();
  await ground.name.fill(name);
}

/** Draws a line or an area and gives what was said of its size just before it was ended. */
export async function drawLine(
  ground: Ground,
  kind: string,
  points: [number, number][],
  name?: string,
): Promise<string> {
  await ground.draw(kind);
  for (const point of points) await ground.tap(...point);
  const size = (await ground.page.locator('[data-size]').textContent()) ?? '';
  await ground.page.getByRole('button', { name: 'Finish' }).click();
  await ground.name.waitFor();
  if (name) await ground.name.fill(name);
  return size;
}

export const saveGround = async ({ page }: Ground) => {
  await page.getByRole('button', { name: /^Save (one change|\d+ changes)$/ }).click();
  await page
    .getByText(/(changes are|change is) saved/)
    .first()
    .waitFor();
};
