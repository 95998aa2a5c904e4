import { expect, test } from './visitors';

test('the explorer runs a query with nothing from outside', async ({ visit }) => {
  const page = await visit();
  await page.goto('/graphql');
  // The query can be run once the editor shows it.
  await expect(page.locator('.graphiql-query-editor')).toContainText('ReleasedSheets');
  await page.getByRole('button', { name: /Execute query/ }).click();
  await expect(page.locator('.result-window')).toContainText('DS-000');
});
