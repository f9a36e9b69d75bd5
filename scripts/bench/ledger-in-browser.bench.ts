import { chromium, type Page } from 'playwright-core';
import type { Bench } from './bench';
import { chromiumFlags, chromiumPath } from '../chromium';
import { findMedian, formatMs } from './measure';

const targetMs = 1000;
const count = 5;

/** From the request to the first rows standing in the page, by the page's own clock. */
async function timeReloadMs(page: Page): Promise<number> {
  await page.reload({ waitUntil: 'commit' });
  const shown = await page.waitForFunction(() =>
    document.querySelectorAll('tbody tr').length > 0 ? performance.now() : false,
  );
  return Number(await shown.jsonValue());
}

export const bench: Bench = {
  name: 'The ledger in the browser, warm: reload to first rows',
  target: `median under ${targetMs / 1000} s`,
  run: async ({ url, demoPassword }) => {
    const browser = await chromium.launch({ executablePath: chromiumPath, args: chromiumFlags });
    try {
      const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
      await page.goto(`${url}/procedures?period=all`);
      await page.getByLabel('E-mail').fill('technologist@marrowcreek.example');
      await page.getByLabel('Password').fill(demoPassword);
      await page.keyboard.press('Enter');
      await page.getByRole('row').nth(1).waitFor();
      await timeReloadMs(page);
      const timesMs: number[] = [];
      for (let run = 0; run < count; run += 1) timesMs.push(await timeReloadMs(page));
      const medianMs = findMedian(timesMs);
      return { measured: `${formatMs(medianMs)} (median of ${count})`, isMet: medianMs < targetMs };
    } finally {
      await browser.close();
    }
  },
};
