import { v7 as uuidv7 } from 'uuid';
import { BENCH_IDS, STAFF_IDS } from '@/server/rehearsal/ids';
import { expect, send, signIn, test } from './support/fixtures';

const PROBLEM = 'application/problem+json';
const OPERATOR = { staffId: STAFF_IDS.operator, sessionVersion: 1 };

test('a command without a session, or of another role, is refused with a problem document', async ({
  playwright,
  post,
  browser,
}) => {
  const nobody = await playwright.request.newContext({ baseURL: post.origin });
  const call = { data: { id: uuidv7(), input: { benchId: BENCH_IDS[0] } } };
  const refused = await nobody.post('/api/commands/tag.call', call);
  expect(refused.status()).toBe(401);
  expect(refused.headers()['content-type']).toContain(PROBLEM);
  expect(await refused.json()).toMatchObject({ type: 'about:blank', status: 401, code: 'sign-in' });

  const context = await browser.newContext({ baseURL: post.origin });
  await signIn(context, post, OPERATOR);
  const forbidden = await context.request.post('/api/commands/tag.hold', {
    data: { id: uuidv7(), input: { tagId: uuidv7(), minutes: 5 } },
  });
  expect(forbidden.status()).toBe(403);
  expect(await forbidden.json()).toMatchObject({
    code: 'forbidden',
    detail: expect.stringContaining('operators'),
  });
  await context.close();
  await nobody.dispose();
});

test('nonsense is refused in words', async ({ browser, post }) => {
  const context = await browser.newContext({ baseURL: post.origin });
  await signIn(context, post, OPERATOR);
  const answer = async (path: string, data: string | object) => {
    const response = await context.request.post(path, {
      data,
      headers: { 'Content-Type': 'application/json' },
    });
    return {
      status: response.status(),
      ...((await response.json()) as { code: string; detail: string }),
    };
  };
  expect(await answer('/api/commands/tag.teleport', { id: uuidv7(), input: {} })).toMatchObject({
    status: 404,
  });
  expect(await answer('/api/commands/tag.call', '{"id":')).toMatchObject({
    status: 422,
    code: 'invalid',
  });
  expect(await answer('/api/commands/tag.call', { id: 'x', input: {} })).toMatchObject({
    status: 422,
  });
  expect(
    await answer('/api/commands/tag.call', { id: uuidv7(), input: { benchId: 7 } }),
  ).toMatchObject({ code: 'invalid' });
  expect(
    await answer('/api/commands/check.note', {
      id: uuidv7(),
      input: { checkId: uuidv7(), text: 'x'.repeat(70_000) },
    }),
  ).toMatchObject({ code: 'invalid' });
  await context.close();
});

test('a signed-out operator’s page sends to the sign-in, and a desk page to the right role', async ({
  browser,
  post,
}) => {
  const context = await browser.newContext({ baseURL: post.origin });
  const page = await context.newPage();
  await page.goto(`/bench/${BENCH_IDS[0]}`);
  await expect(page).toHaveURL(/\/sign-in\?next=/);
  await signIn(context, post, OPERATOR);
  const response = await page.goto('/desk/staff');
  expect(response?.status()).toBe(403);
  await context.close();
});

test('what was accepted is there after the server was killed', async ({ browser, post }) => {
  const context = await browser.newContext({ baseURL: post.origin });
  await signIn(context, post, { staffId: STAFF_IDS.lead, sessionVersion: 1 });
  const opened = await send<{ benchId: string }>(context, post, 'bench.take', {
    benchId: BENCH_IDS[1],
  });
  await post.stop({ kill: true });
  await post.restart();
  const page = await context.newPage();
  await page.goto(`/bench/${opened.benchId}`);
  await expect(page.getByText('Ilse Marrow').first()).toBeVisible();
  await context.close();
});
