import { type Locator, type Page } from '@playwright/test';
import { DEMO_PASSWORD, emailOf, expect, test } from './visitors';

const TITLE = 'Invented series, typed';
/** Invented: T / K, P / kPa, D / (cm²/s), u(D) / %, number of runs. The third D has a slip of the decimal sign. */
const TYPED = [
  ['293.2', '101.3', '0.651', '1.5', '3'],
  ['303.2', '101.3', '0.690', '1.5', '3'],
  ['313.2', '101.3', '7.31', '1.5', '2'],
  ['323.2', '101.3', '0.772', '1.5', '3'],
  ['333.2', '101.3', '0.815', '1.5', '3'],
  ['343.2', '101.3', '0.859', '1.5', '3'],
];
/** No page has more places to stop at. */
const MOST_STOPS = 150;

test('brings a series in by keyboard alone, from sign-in to a submitted series', async ({ visit }) => {
  const page = await visit();
  await page.goto('/sign-in');
  await tabTo(page, page.getByLabel('E-mail'));
  await page.keyboard.type(emailOf('researcher2'));
  await tabTo(page, page.getByLabel('Password', { exact: true }));
  await page.keyboard.type(DEMO_PASSWORD);
  await page.keyboard.press('Enter');
  await tabTo(page, page.getByRole('link', { name: 'Bring in a series' }).first());
  await page.keyboard.press('Enter');

  await test.step('choose the pair from the matches', async () => {
    await tabTo(page, page.getByLabel('One substance'));
    await page.keyboard.type('helium');
    await expect(page.getByRole('listbox').getByRole('option').first()).toBeVisible();
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Enter');
    await expect(page.getByRole('listbox').getByRole('option')).toHaveCount(0);
    await tabTo(page, page.getByLabel('The other'));
    // A whole name need not be chosen from the list.
    await page.keyboard.type('methane');
    await tabTo(page, page.getByLabel('Method'));
    await page.keyboard.type('closed tube');
  });

  await test.step('type the points into the grid', async () => {
    await tabTo(page, page.getByRole('tab', { name: 'Paste' }));
    await page.keyboard.press('ArrowLeft');
    await tabTo(page, page.getByRole('textbox', { name: 'temperature, row 2' }));
    for (const row of TYPED) {
      for (const cell of row) {
        await page.keyboard.type(cell);
        await page.keyboard.press('Tab');
      }
    }
  });

  await test.step('decide the doubt', async () => {
    const reading = page.getByRole('radio', { name: /^read as 0\.731/ });
    await expect(reading).toBeVisible();
    await tabTo(page, page.getByRole('radio', { name: /^(read as|keep|leave)/ }).first());
    await page.keyboard.press('Space');
    await expect(reading).toBeChecked();
  });

  await test.step('describe it and keep it whole', async () => {
    await tabTo(page, page.getByLabel('Title'));
    await page.keyboard.type(TITLE);
    await tabTo(page, page.getByLabel('Source, DOI or notebook'));
    await page.keyboard.type('invented for the browser test');
    const keep = page.getByRole('button', { name: 'Keep whole' });
    await expect(keep).not.toHaveAttribute('aria-disabled', 'true');
    await tabTo(page, keep);
    await page.keyboard.press('Enter');
  });

  await expect(page.getByRole('heading', { level: 1, name: TITLE })).toBeVisible();
  await tabTo(page, page.getByRole('button', { name: 'Submit' }));
  await page.keyboard.press('Enter');
  await expect(page.getByText('submitted').first()).toBeVisible();
});

/** Presses Tab until the focus is on `target`: what cannot be reached so cannot be used by keyboard. */
async function tabTo(page: Page, target: Locator): Promise<void> {
  await expect(target).toBeVisible();
  for (let stop = 0; stop < MOST_STOPS; stop++) {
    if (await target.evaluate((element) => element === document.activeElement)) return;
    await page.keyboard.press('Tab');
  }
  throw new Error(`The Tab key does not reach ${target.toString()}.`);
}
