import { BENCH_IDS, STAFF_IDS } from '@/server/rehearsal/ids';
import { expect, test } from './support/fixtures';

const OPERATOR = { staffId: STAFF_IDS.operator, sessionVersion: 1 };
const LEAD = { staffId: STAFF_IDS.lead, sessionVersion: 1 };

test.use({ apart: 'bench' });
test.describe.configure({ mode: 'serial' });

test('a check that is half done is finished by touch alone, on a simulated tester', async ({
  browser,
  windows,
  post,
}) => {
  test.setTimeout(180_000);
  const opened = await windows.open('bench', { person: OPERATOR });
  const context = await browser.newContext({
    storageState: await opened.context().storageState(),
    viewport: { width: 1366, height: 768 },
    baseURL: post.origin,
    hasTouch: true,
    reducedMotion: 'reduce',
  });
  const bench = await context.newPage();
  await bench.goto(`/bench/${BENCH_IDS[0]}`);
  const tap = (name: RegExp) => bench.getByRole('button', { name }).first().tap();
  await tap(/Take this bench/);
  await expect(bench.getByText('Simulated', { exact: false }).first()).toBeVisible();

  const offered = bench.getByRole('region', { name: 'From the tester' });
  const signOff = bench.getByRole('button', { name: /Sign off/ });
  while (!(await signOff.isVisible())) {
    await tap(/simulate/);
    await expect(offered).toBeVisible();
    await tap(/^(Enter )?accept/i);
    await expect(offered).toHaveCount(0);
    await expect(signOff.or(bench.getByRole('button', { name: /simulate/ })).first()).toBeVisible();
  }
  await signOff.tap();
  await expect(bench.getByText(/^Hand [A-Y]\d\d back$/)).toBeVisible();
  await tap(/peg/);
  await expect(bench.getByRole('button', { name: /Call|Take/ }).first()).toBeVisible();
  await context.close();
});

test('the lead moves, holds and marks a tag unfit at the desk; phone and board follow', async ({
  windows,
}) => {
  const desk = await windows.open('desk', { person: LEAD });
  const phone = await windows.open('phone');
  const board = await windows.open('board');
  await phone.goto('/m/quillmoor-autumn-meet/join');
  await phone.getByRole('radio', { name: /Dial wrench/ }).check();
  await phone.getByLabel('From').fill('40');
  await phone.getByLabel('To', { exact: true }).fill('200');
  await phone.getByLabel('Unit').selectOption('N.m');
  await phone.getByRole('radio', { name: /Up to its maximum/ }).check();
  await phone.getByRole('button', { name: 'Join the line' }).click();
  await expect(phone).toHaveURL(/\/t\//);
  const code = await phone.getByRole('heading', { level: 1 }).innerText();

  await desk.goto('/desk/line/quillmoor-autumn-meet');
  await board.goto('/m/quillmoor-autumn-meet/board');
  const row = desk.getByRole('row').filter({ hasText: code });
  await row.getByRole('button').first().click();
  const sheet = desk.getByRole('complementary', { name: new RegExp(code) });
  await sheet.getByText('Move to another place').click();
  await sheet.getByLabel('New place').fill('1');
  await sheet.getByRole('button', { name: `Move ${code}` }).click();
  await expect(sheet.getByText(/Say why|needed|reason/i).first()).toBeVisible();
  await sheet.getByLabel('Reason').first().fill('Starts in ten minutes');
  await sheet.getByRole('button', { name: `Move ${code}` }).click();
  await expect(phone.getByText('You are next').first()).toBeVisible();
  await expect(board.getByText(code).first()).toBeVisible();

  await sheet.getByText('Hold the turn').click();
  await sheet.getByLabel('Minutes from now').fill('20');
  await sheet.getByRole('button', { name: `Hold ${code}` }).click();
  await expect(phone.getByText('Your turn is held').first()).toBeVisible();

  await sheet.getByText(/unfit/i).first().click();
  await sheet
    .getByLabel(/Why|Reason/)
    .last()
    .fill('The square is cracked');
  await sheet.getByRole('button', { name: /unfit/i }).last().click();
  await expect(phone.getByText('We cannot check this tool').first()).toBeVisible();
  await expect(phone.getByText('The square is cracked')).toBeVisible();
});
