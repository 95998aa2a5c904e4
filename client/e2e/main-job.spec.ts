import { execFileSync } from 'node:child_process';
import { type Locator, type Page } from '@playwright/test';
import { DEMO_PASSWORD, expect, signIn, test } from './visitors';
import { INVENTED_POINTS, inventedWorkbook } from './invented-series';

const TITLE = 'Invented two-bulb series';
/** A pair that the demo does not have. */
const PAIR = /benzene \+ argon|argon \+ benzene/i;

test('carries a series from a workbook to a released sheet that a visitor prints', async ({ visit }) => {
  const [researcher, editor, reviewer, visitor] = [await visit(), await visit(), await visit(), await visit()];
  await test.step('a researcher brings the workbook in and submits the series', () => bringIn(researcher));
  await test.step('an editor accepts and fits it, drafts a version, sends it to review', () => prepare(editor));
  await test.step('a second editor reviews and releases it', () => reviewAndRelease(reviewer));
  await test.step('a visitor reads, evaluates and prints the sheet', () => readAndPrint(visitor));
});

async function bringIn(page: Page): Promise<void> {
  await signIn(page, 'researcher');
  await page.getByRole('link', { name: 'Bring in a series' }).first().click();
  await chooseSubstance(page, 'One substance', 'benzene');
  await chooseSubstance(page, 'The other', 'argon');
  await page.getByLabel('Method').fill('two-bulb cell');
  await page.getByRole('tab', { name: 'Upload a file' }).click();
  await page.getByLabel('CSV or XLSX').setInputFiles({
    name: 'invented.xlsx',
    mimeType: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
    buffer: await inventedWorkbook(),
  });
  await expect(page.getByText('times what its neighbours suggest')).toBeVisible();
  await page.getByLabel('Title').fill(TITLE);
  await page.getByLabel('Source, DOI or notebook').fill('invented for the browser test');
  await expect(page.getByRole('button', { name: 'Keep whole' })).toHaveAttribute('aria-disabled', 'true');
  await page.getByRole('radio', { name: /^read as/ }).check();
  await expect(page.getByText(`${INVENTED_POINTS.length} of ${INVENTED_POINTS.length} rows`)).toBeVisible();
  await page.getByRole('button', { name: 'Keep whole' }).click();
  await expect(page.getByRole('heading', { level: 1, name: TITLE })).toBeVisible();
  await page.getByRole('button', { name: 'Submit' }).click();
  await expect(page.getByText('submitted').first()).toBeVisible();
}

async function chooseSubstance(page: Page, field: string, name: string): Promise<void> {
  await page.getByLabel(field).fill(name);
  await page
    .getByRole('listbox')
    .getByRole('option', { name: new RegExp(`^${name}`) })
    .first()
    .click();
}

async function prepare(page: Page): Promise<void> {
  await signIn(page, 'editor');
  await taskLink(page, /^Accept or return a series/).click();
  await page.getByRole('button', { name: 'Accept', exact: true }).click();
  await expect(page.getByText('accepted').first()).toBeVisible();
  await page.getByRole('link', { name: 'Workspace of the pair' }).click();
  await page.getByRole('button', { name: 'Keep as fit 1' }).click();
  await page.getByRole('link', { name: 'Draft a version from fit 1' }).first().click();
  await page.getByLabel('Summary').fill('Rests on one invented series; made by the browser test.');
  await page.getByRole('button', { name: 'Draft the version' }).click();
  await page.getByRole('button', { name: 'Submit 1.0 for review' }).click();
  await expect(page.getByText('in review').first()).toBeVisible();
}

async function reviewAndRelease(page: Page): Promise<void> {
  await signIn(page, 'editor2');
  await taskLink(page, /^Review version 1\.0/).click();
  await page.getByRole('button', { name: 'Reproduce' }).click();
  await expect(page.getByText('Reproduced: every number agrees to 12 digits.')).toBeVisible();
  for (const yes of await page.getByRole('radio', { name: 'yes', exact: true }).all()) await yes.check();
  await page.getByLabel('Remark').fill('Checked by the browser test.');
  await page.getByRole('button', { name: 'Approve 1.0' }).click();
  await page.getByRole('link', { name: 'Release this version' }).click();
  await page.getByLabel(/^Your password again/).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Release 1.0 now' }).click();
  await expect(page.getByText('released').first()).toBeVisible();
}

/** The task of the home page that is about the pair of this test. */
const taskLink = (page: Page, what: RegExp): Locator =>
  page.getByRole('link', { name: what }).filter({ hasText: PAIR });

async function readAndPrint(page: Page): Promise<void> {
  await page.goto('/');
  await page.getByRole('searchbox', { name: 'Find a gas pair or substance' }).first().fill('benzene');
  await page.keyboard.press('Enter');
  await page.getByRole('link', { name: PAIR }).first().click();
  await expect(page.getByRole('heading', { level: 1, name: PAIR })).toBeVisible();
  const evaluator = page.getByRole('form', { name: 'Evaluate' });
  await evaluator.getByRole('textbox', { name: 'Temperature' }).fill('330');
  const answer = evaluator.locator('output');
  await expect(answer).toHaveAttribute('aria-busy', 'false');
  await expect.poll(async () => Number.parseFloat(await answer.innerText())).toBeCloseTo(expectedAt330(), 2);

  const fitted = await conciseNumbers(page.locator('#correlation'));
  expect(fitted.length).toBeGreaterThanOrEqual(2);
  const downloading = page.waitForEvent('download');
  await page.getByRole('link', { name: 'PDF, A4' }).click();
  const text = textOfPdf(await (await downloading).path());
  for (const number of fitted) expect(text).toContain(number);
}

/** The invented law at 330 K and 101.325 kPa, cm²/s; the fit must come near it. */
const expectedAt330 = (): number => 0.0931 * (330 / 298.15) ** 1.78;

/** Numbers such as 0.12455(50) in a section, its evaluator and margin apart. */
async function conciseNumbers(section: Locator): Promise<string[]> {
  const text = await section.evaluate((element) => {
    const copy = element.cloneNode(true) as Element;
    copy.querySelectorAll('form, aside').forEach((part) => part.remove());
    return copy.textContent;
  });
  return text.match(/\d+\.\d+\(\d+\)/g) ?? [];
}

/** The text of a PDF file, by poppler's pdftotext. */
const textOfPdf = (file: string): string => execFileSync('pdftotext', ['-layout', file, '-'], { encoding: 'utf8' });
