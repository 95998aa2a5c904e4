import AxeBuilder from '@axe-core/playwright';
import { type Page } from '@playwright/test';
import { findAddresses } from './addresses';
import { type DemoAccount, expect, signIn, test } from './visitors';

/** Criteria of WCAG 2.0, 2.1 and 2.2, levels A and AA, as axe-core tags them. */
const CRITERIA = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

/** Rules of axe that depend on colours. */
const COLOURS = ['color-contrast', 'link-in-text-block'];

const READERS: readonly [DemoAccount | null, string][] = [
  [null, 'a visitor'],
  ['researcher', 'a researcher'],
  ['editor', 'an editor'],
  ['editor2', 'a second editor'],
  ['administrator', 'an administrator'],
];

for (const [account, who] of READERS) {
  test(`no page of ${who} shuts anybody out, by day or by night`, async ({ visit, request }) => {
    const page = await visit({ reducedMotion: 'reduce' });
    if (account !== null) await signIn(page, account);
    for (const address of await findAddresses(request, account)) {
      await page.goto(address);
      await settled(page);
      expect(await violations(page, (axe) => axe.withTags(CRITERIA)), `${address} by day`).toEqual([]);
      await turnTo(page, 'Night edition');
      // The night edition has the same structure in other colours.
      expect(await violations(page, (axe) => axe.withRules(COLOURS)), `${address} by night`).toEqual([]);
      await turnTo(page, 'Day edition');
    }
  });
}

/** The page with its data, not its hairlines. */
async function settled(page: Page): Promise<void> {
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  await expect(page.getByRole('status').filter({ hasText: /^Loading / })).toHaveCount(0);
}

/** Changes the edition and waits until every colour has changed. */
async function turnTo(page: Page, edition: 'Night edition' | 'Day edition'): Promise<void> {
  await page.getByRole('button', { name: edition }).click();
  await page.evaluate(() => Promise.allSettled(document.getAnimations().map(({ finished }) => finished)));
}

/** What axe finds serious or critical, in words. */
async function violations(page: Page, choose: (axe: AxeBuilder) => AxeBuilder): Promise<string[]> {
  // Only what is wrong is described, in the page itself: it is much less work than describing all that is right.
  const axe = new AxeBuilder({ page }).options({ resultTypes: ['violations'] }).setLegacyMode();
  const { violations: found } = await choose(axe).analyze();
  return found
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join('; ')}`);
}
