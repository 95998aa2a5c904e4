import { type BrowserContextOptions, type Page, expect, test as base } from '@playwright/test';

/** Opens a browser of one's own: nothing of the others' is remembered in it. */
type Visit = (options?: BrowserContextOptions) => Promise<Page>;

/**
 * Every page of every test is watched: a request to another origin, an error in the console, an uncaught error or a breach
 * of the content security policy fails the test.
 */
export const test = base.extend<{ visit: Visit }>({
  visit: async ({ browser, baseURL }, give) => {
    const complaints: string[] = [];
    const origin = new URL(baseURL ?? '').origin;
    const visits: Page[] = [];
    await give(async (options = {}) => {
      const context = await browser.newContext(options);
      await context.addInitScript(() => {
        document.addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI }) => {
          reportError(new Error(`content security policy: ${violatedDirective} ${blockedURI}`));
        });
      });
      const page = await context.newPage();
      visits.push(page);
      page.on('request', (request) => {
        const url = new URL(request.url());
        if (url.protocol.startsWith('http') && url.origin !== origin)
          complaints.push(`asks elsewhere: ${request.url()}`);
      });
      page.on('console', (message) => {
        if (message.type() === 'error') complaints.push(`${page.url()}: ${message.text()}`);
      });
      page.on('pageerror', (error) => complaints.push(`${page.url()}: ${error.message}`));
      return page;
    });
    for (const page of visits) await page.context().close();
    expect(complaints).toEqual([]);
  },
});

/** The demo's accounts. */
export const DEMO_PASSWORD = 'diffolio-demo';
export type DemoAccount = 'researcher' | 'researcher2' | 'modeller' | 'editor' | 'editor2' | 'administrator';
export const emailOf = (account: DemoAccount): string => `${account}@demo.example`;

/** Signs in as a person of the demo, by the page. */
export async function signIn(page: Page, account: DemoAccount): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(emailOf(account));
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(/\/home$/);
}

export { expect };
