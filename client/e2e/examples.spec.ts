import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { type APIRequestContext } from '@playwright/test';
import { DEMO_PASSWORD, emailOf, expect, test } from './visitors';

const run = promisify(execFile);

/** How each example of the API guide is run, its text as the last argument. */
const RUNNERS = {
  curl: ['sh', '-c'],
  Python: ['python3', '-c'],
  JavaScript: [process.execPath, '--input-type=module', '-e'],
} as const;

const NEW_KEY = 'mutation { createApiKey(name: "examples of the API guide") { secret problems { message } } }';

async function keyOfModeller(request: APIRequestContext): Promise<string> {
  const signedIn = await request.post('/api/auth/sign-in', {
    data: { email: emailOf('modeller'), password: DEMO_PASSWORD },
  });
  const { accessToken } = await signedIn.json();
  const headers = { Authorization: `Bearer ${accessToken}` };
  const answer = await (await request.post('/graphql', { headers, data: { query: NEW_KEY } })).json();
  return answer.data.createApiKey.secret;
}

test('the examples of the API guide run as they stand and print what the page shows', async ({ visit, request }) => {
  const key = await keyOfModeller(request);
  const page = await visit();
  await page.goto('/api-guide');
  const shown = await page.getByRole('region', { name: /answer/i }).textContent();
  // Numbers in scientific notation of the answer: the diffusivities.
  const diffusivities =
    /"diffusivities": \[([^\]]+)\]/
      .exec(shown ?? '')?.[1]
      ?.split(',')
      .map(Number) ?? [];
  expect(diffusivities.length).toBeGreaterThan(1);

  for (const [language, [command, ...args]] of Object.entries(RUNNERS)) {
    await page.getByRole('tab', { name: language }).click();
    const code = await page.getByRole('region', { name: language }).textContent();
    const { stdout } = await run(command, [...args, code ?? ''], { env: { ...process.env, DIFFOLIO_KEY: key } });
    const printed = (stdout.match(/\d[\d.]*e-\d+|0\.0\d+/g) ?? []).map(Number);
    expect(printed, `${language} printed ${stdout}`).toEqual(expect.arrayContaining(diffusivities));
  }
});
