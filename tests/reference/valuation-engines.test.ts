import { chromium, type Browser } from '@playwright/test';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { ensureBrowser } from '../../scripts/checks/browser.mjs';
import { bundleForBrowser } from './engines/bundle.ts';
import { compute } from './engines/compute.ts';

const minutes = 60_000;
let browser: Browser;

beforeAll(async () => {
  browser = await chromium.launch({ executablePath: ensureBrowser(), args: ['--no-sandbox'] });
}, 5 * minutes);
afterAll(() => browser.close());

/** Every number of a result by its path, to nine significant digits; words stay as they are. */
function digitsOf(value: unknown, path = '', into: Record<string, string> = {}): Record<string, string> {
  if (typeof value === 'number') into[path] = value.toPrecision(9);
  else if (typeof value === 'object' && value !== null) {
    for (const [key, one] of Object.entries(value)) digitsOf(one, `${path}.${key}`, into);
  } else into[path] = `${String(value)}`;
  return into;
}

test(
  'Node and Chromium give the same nine digits of everything, seed by seed',
  async () => {
    const page = await browser.newPage();
    await page.addScriptTag({ content: await bundleForBrowser() });
    for (const seed of [0, 42, 4_294_967_295]) {
      const there = await page.evaluate(
        (given) => (globalThis as unknown as { engines: { compute: typeof compute } }).engines.compute(given),
        seed,
      );
      const [here, inBrowser] = [digitsOf(compute(seed)), digitsOf(there)];
      expect(Object.keys(here).length).toBeGreaterThan(1500);
      expect(inBrowser).toEqual(here);
    }
  },
  minutes,
);

test('the comparison sees a change in the ninth digit', () => {
  expect(digitsOf({ a: [1.00000001] })).not.toEqual(digitsOf({ a: [1.00000002] }));
});
