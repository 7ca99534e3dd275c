import type { Page } from '@playwright/test';
import { expect, test } from './support/fixtures';

const JOIN = '/m/quillmoor-autumn-meet/join';

async function fillShortForm(page: Page): Promise<void> {
  await page.getByRole('radio', { name: /Click wrench with a scale/ }).check();
  await page.getByLabel('From').fill('40');
  await page.getByLabel('To', { exact: true }).fill('200');
  await page.getByLabel('Unit').selectOption('N.m');
  await page.getByRole('radio', { name: /Up to its maximum/ }).check();
}

const code = (page: Page) => page.getByRole('heading', { level: 1 });

test('joins with the short form, and the ticket is there after a reload', async ({ windows }) => {
  const phone = await windows.open('phone');
  await phone.goto(JOIN);
  await fillShortForm(phone);
  await phone.getByRole('button', { name: 'Join the line' }).click();
  await expect(phone).toHaveURL(/\/t\/[\w-]{43}$/);
  await expect(code(phone)).toHaveText(/^[A-Y]\d\d$/);
  await expect(phone.getByText(/tools? before yours/).first()).toBeVisible();
  await expect(phone.getByText('follows your tool live')).toBeVisible();
  const joined = await code(phone).innerText();
  await phone.reload();
  await expect(code(phone)).toHaveText(joined);
});

test('joins, and leaves, with no script at all', async ({ windows }) => {
  const phone = await windows.open('phone', { javaScript: false });
  await phone.goto(JOIN);
  await fillShortForm(phone);
  await phone.getByRole('button', { name: 'Join the line' }).click();
  await expect(phone).toHaveURL(/\/t\/[\w-]{43}$/);
  await expect(phone.getByText(/tools? before yours/).first()).toBeVisible();
  await phone.getByText('Leave the line', { exact: true }).click();
  await phone.getByRole('button', { name: 'Yes, leave the line' }).click();
  await expect(phone.getByText('You have left the line')).toBeVisible();
});

test('says what is wrong beside the field, and keeps what was typed', async ({ windows }) => {
  for (const javaScript of [true, false]) {
    const phone = await windows.open('phone', { javaScript });
    await phone.goto(JOIN);
    await phone.getByRole('radio', { name: /Click wrench with a scale/ }).check();
    await phone.getByLabel('From').fill('200');
    await phone.getByLabel('To', { exact: true }).fill('40');
    await phone.getByLabel('Unit').selectOption('N.m');
    await phone.getByRole('radio', { name: /Up to its maximum/ }).check();
    await phone.getByRole('button', { name: 'Join the line' }).click();
    await expect(phone.getByText(/Are they swapped\?/).first()).toBeVisible();
    await expect(phone.getByLabel('From')).toHaveValue('200');
    await expect(phone.getByRole('radio', { name: /Click wrench with a scale/ })).toBeChecked();
    await phone.getByLabel('To', { exact: true }).fill('two hundred');
    await phone.getByRole('button', { name: 'Join the line' }).click();
    await expect(phone.getByText(/must be a number/).first()).toBeVisible();
  }
});

test('adds a second tool of the same person, each ticket naming the other', async ({ windows }) => {
  const phone = await windows.open('phone');
  await phone.goto(JOIN);
  await fillShortForm(phone);
  await phone.getByRole('button', { name: 'Join the line' }).click();
  await expect(code(phone)).toHaveText(/^[A-Y]\d\d$/);
  const first = await code(phone).innerText();
  await phone.getByRole('link', { name: 'Add another tool' }).click();
  await fillShortForm(phone);
  await phone.getByRole('button', { name: 'Add this tool' }).click();
  await expect(code(phone)).not.toHaveText(first);
  await expect(phone.getByRole('navigation', { name: 'Your other tags' })).toContainText(first);
});

test('a form that is sent twice gives one tag', async ({ windows, post }) => {
  const phone = await windows.open('phone', { javaScript: false });
  await phone.goto(JOIN);
  await fillShortForm(phone);
  const again = await phone.context().newPage();
  const form = await phone
    .locator('form')
    .first()
    .evaluate((element: HTMLFormElement) =>
      [...new FormData(element).entries()].map(([name, value]) => [name, String(value)] as const),
    );
  await phone.getByRole('button', { name: 'Join the line' }).click();
  await expect(code(phone)).toHaveText(/^[A-Y]\d\d$/);
  const multipart = Object.fromEntries(form);
  const response = await again.request.post(`${post.origin}${JOIN}`, {
    multipart,
    maxRedirects: 0,
  });
  expect(response.status()).toBe(303);
  await again.goto(String(response.headers().location));
  await expect(code(again)).toHaveText(await code(phone).innerText());
});

test('an unknown ticket and an unknown record are not found, with no hint', async ({
  windows,
  post,
}) => {
  const phone = await windows.open('phone');
  for (const path of ['/t/', '/r/']) {
    const response = await phone.request.get(`${post.origin}${path}${'A'.repeat(43)}`);
    expect(response.status()).toBe(404);
  }
});

test('says when it last heard of the post, and catches up when it is back', async ({ windows }) => {
  const phone = await windows.open('phone');
  await phone.goto(JOIN);
  await fillShortForm(phone);
  await phone.getByRole('button', { name: 'Join the line' }).click();
  await expect(phone.getByText('follows your tool live')).toBeVisible();
  await phone.context().setOffline(true);
  await expect(phone.getByText(/Last heard \d\d:\d\d/)).toBeVisible();
  await phone.context().setOffline(false);
  await expect(phone.getByText('follows your tool live')).toBeVisible({ timeout: 30_000 });
  // What the browser says of the network it was cut off from is no fault of the page.
  windows.errors.length = 0;
});
