import type { Page } from '@playwright/test';
import { laySerialCable, type SerialCable } from '@/tests/support/socat';
import { expect, SCREENS, test, watch } from './support/fixtures';
import { enterTester, MEET, OWNER, setUp } from './support/own-post';

test.use({ flags: [] });
test.describe.configure({ mode: 'serial' });

// What the tester sends over the cable for the five readings of a preset wrench of 100 N·m.
const READINGS_NM = [98.0, 98.2, 97.9, 98.1, 98.3];

/**
 * The same by hand, from the definitions alone. ISO 6789-1: deviation 100·(x_a − x_r)/x_r.
 * GUM: certificate 0.2 %/2; resolution half-step 0.05/√3 N·m of 100 N·m, at reading and at zero;
 * no drift, no error, no coefficient. k 2.00 for 95.45 % with infinite degrees of freedom (Table G.2).
 */
const BY_HAND = {
  deviations: ['+2.04 %', '+1.83 %', '+2.15 %', '+1.94 %', '+1.73 %'],
  // (2.0408 + 1.8330 + 2.1450 + 1.9368 + 1.7294)/5
  meanDeviation: '+1.94 %',
  // (98.0 + 98.2 + 97.9 + 98.1 + 98.3)/5
  delivered: /98\.1\d? ±/,
  // 2·√(0.1² + 2·0.0288675²) = 0.2160
  reference: /0\.216|0\.22/,
  verdict: 'Within tolerance',
};

const code = (page: Page) => page.getByRole('heading', { level: 1 });

test('the whole job, with four windows open at once, fed by a tester on a serial cable', async ({
  browser,
  post,
}) => {
  test.setTimeout(240_000);
  const cable: SerialCable = await laySerialCable();
  const errors: string[] = [];
  const lead = await setUp(browser, post);

  // The owner finds the benches at the desk, and puts the tester on bench 1.
  const desk = await lead.newPage();
  watch(desk, errors);
  await desk.goto('/bench');
  const benchLink = desk.getByRole('link', { name: /Bench 1/ }).first();
  const benchPath = String(await benchLink.getAttribute('href'));
  const benchId = benchPath.split('/').at(-1)!;
  await enterTester(lead, post, benchId, {
    kind: 'serial',
    path: cable.postEnd,
    baudRate: 9600,
    unit: 'N.m',
  });
  await desk.goto('/desk/staff');
  await desk.getByLabel('Name', { exact: true }).fill('Pip Underhill');
  await desk.getByLabel('Sign-in name').fill('pip');
  await desk.getByLabel('Password').fill('walnut-by-the-door');
  await desk.getByRole('button', { name: 'Add the person' }).click();
  await expect(desk.getByRole('cell', { name: 'Pip Underhill' })).toBeVisible();

  const open = async (kind: keyof typeof SCREENS) => {
    const context = await browser.newContext({
      viewport: SCREENS[kind],
      baseURL: post.origin,
      reducedMotion: 'reduce',
    });
    const page = await context.newPage();
    // The wrong code at the hand-back is refused on purpose.
    watch(page, errors, kind === 'bench' ? [/409 \(Conflict\)/] : []);
    return { page };
  };
  const { page: board } = await open('board');
  const { page: phone } = await open('phone');
  const { page: bench } = await open('bench');
  await desk.goto('/desk');
  await expect(desk.getByRole('heading', { name: /line/i }).first()).toBeVisible();
  await board.goto(`/m/${MEET.slug}/board`);

  // The visitor joins from the phone, and board and desk show it.
  await phone.goto(`/m/${MEET.slug}/join`);
  await phone.getByText('More kinds, or not sure').click();
  await phone.getByRole('radio', { name: /^Preset wrench/ }).check();
  await phone.getByLabel('Preset value').fill('100');
  await phone.getByLabel('Unit').selectOption('N.m');
  await phone.getByRole('radio', { name: /Up to its maximum/ }).check();
  await phone.getByText('About you').click();
  await phone.getByLabel('Name', { exact: true }).fill('Tamsin Reed');
  await phone.getByRole('button', { name: 'Join the line' }).click();
  await expect(code(phone)).toHaveText('A01');
  await expect(phone.getByText('You are next')).toBeVisible();
  await expect(board.getByText('A01').first()).toBeVisible();
  await expect(desk.getByText('Tamsin Reed')).toBeVisible();
  await expect(board.getByText('Tamsin Reed')).toHaveCount(0);

  // The operator signs in by the form, and takes the bench. From here on by keyboard alone.
  await bench.goto('/bench');
  await expect(bench).toHaveURL(/sign-in/);
  await bench.getByLabel('Sign-in name').fill('pip');
  await bench.getByLabel('Password').fill('walnut-by-the-door');
  await bench.keyboard.press('Enter');
  await expect(bench).toHaveURL(/\/bench$/);
  await bench
    .getByRole('link', { name: /Bench 1/ })
    .first()
    .focus();
  await bench.keyboard.press('Enter');
  await bench.getByRole('button', { name: /Take this bench/ }).focus();
  await bench.keyboard.press('Enter');
  await expect(bench.getByRole('button', { name: /Call A01/ }).first()).toBeVisible();
  await bench.keyboard.press('Enter');
  await expect(phone.getByText('Come to bench 1 now')).toBeVisible();
  await expect(phone).toHaveTitle(/Come to bench 1 now/);
  await expect(board.getByText(/Come to bench 1/)).toBeVisible();
  await expect(desk.getByText(/called/i).first()).toBeVisible();

  await expect(bench.getByRole('button', { name: /Tool is here/i }).first()).toBeVisible();
  await bench.keyboard.press('Enter');
  await expect(phone.getByText('On bench 1')).toBeVisible();

  // Whose tool, what its plate says, the tester's mode, the cautions: each by the space bar.
  await expect(bench.getByText('Tamsin Reed').first()).toBeVisible();
  for (const name of [/Ticket and tag say A01/, /Read, and so it is/, /peak/i]) {
    const box = bench.getByRole('checkbox', { name }).first();
    await box.focus();
    await bench.keyboard.press('Space');
    await expect(box).toBeChecked();
  }
  await bench.getByLabel('Ambient').fill('21');
  await bench.keyboard.press('Control+Enter');
  const pulling = bench.getByRole('region', { name: 'The pull in hand' });
  await expect(pulling).toContainText('Exercise pulls');
  await expect(board.getByText('Exercise pull 1 of 5')).toBeVisible();

  // Exercise pulls count as they come over the cable.
  for (let pull = 1; pull <= 5; pull += 1) {
    await cable.send('+99.0 N.m\r\n');
    await expect(pulling).toContainText(pull < 5 ? `Pull ${pull + 1} of 5` : 'Set point 1 of 1');
  }

  // The readings: each is offered, accepted with Enter, and on the phone at once.
  const offered = bench.getByRole('region', { name: 'From the tester' });
  for (const [index, value] of READINGS_NM.entries()) {
    if (index === 2) {
      // The cable is pulled out in mid-check: it shows, nothing is lost, and it goes on when it is back.
      await cable.pullOut();
      await expect(bench.getByText(/cable/i).first()).toBeVisible();
      await cable.plugIn();
      await expect(bench.getByText(/cable/i)).toHaveCount(0, { timeout: 20_000 });
    }
    await cable.send(`+${value.toFixed(1)} N.m\r\n`);
    await expect(offered).toContainText(`${value.toFixed(1)} N·m`);
    if (index === 3) {
      // A bad pull is voided with its fault, and asked for again.
      await bench.keyboard.press('v');
      await bench.keyboard.press('2');
      await bench.keyboard.press('Enter');
      await expect(offered).toHaveCount(0);
      await cable.send(`+${value.toFixed(1)} N.m\r\n`);
      await expect(offered).toContainText(`${value.toFixed(1)} N·m`);
    }
    await bench.keyboard.press('Enter');
    await expect(offered).toHaveCount(0);
    await expect(
      phone.getByRole('list', { name: 'Readings, newest first' }).getByRole('listitem'),
    ).toHaveCount(index + 1);
  }
  await expect(phone.getByRole('list', { name: 'Readings, newest first' })).toContainText(
    '98.3 N·m',
  );
  await expect(board.getByText('All readings taken')).toBeVisible();

  // The verdict in words, and sign-off.
  await expect(bench.getByText(BY_HAND.verdict).first()).toBeVisible();
  await bench.keyboard.press('Control+Enter');
  await expect(bench.getByText('Hand A01 back')).toBeVisible();
  await expect(phone.getByText('Ready to collect')).toBeVisible();
  await expect(phone.getByRole('region', { name: 'Result' })).toContainText(BY_HAND.verdict);

  // The right tool to the right person: a wrong code is loud, the right one completes.
  const ticketCode = bench.getByLabel('Code on the visitor’s ticket');
  await ticketCode.fill('A02');
  await bench.keyboard.press('Enter');
  await expect(bench.getByText(/Do not hand it over/).first()).toBeVisible();
  await ticketCode.fill('A01');
  await bench.keyboard.press('Enter');
  await expect(phone.getByText('Back with you')).toBeVisible();
  await expect(board.getByText(/1 tool checked today|1 checked/)).toBeVisible();

  // The result page, against the numbers worked out by hand.
  await phone.getByRole('link', { name: 'See the full result' }).click();
  await expect(code(phone)).toContainText(BY_HAND.verdict);
  await phone
    .locator('details')
    .evaluateAll((all) => all.forEach((one) => ((one as HTMLDetailsElement).open = true)));
  const page = phone.getByRole('main');
  for (const deviation of BY_HAND.deviations) await expect(page).toContainText(deviation);
  await expect(page).toContainText(BY_HAND.meanDeviation);
  await expect(page).toContainText(BY_HAND.delivered);
  await expect(page).toContainText(BY_HAND.reference);
  for (const words of [
    'QL-2041',
    'Quillon Laboratory',
    'T-07',
    'HL-',
    'not a calibration certificate',
    'The drive slipped',
  ]) {
    await expect(page).toContainText(words);
  }
  await expect(page).not.toContainText('Tamsin');

  expect(errors, 'console errors').toEqual([]);
  for (const context of browser.contexts()) await context.close();
  await cable.remove();
});

test('an owner whose account exists signs in by the form; a wrong password says no more than that', async ({
  browser,
  post,
}) => {
  const context = await browser.newContext({ baseURL: post.origin });
  const page = await context.newPage();
  await page.goto('/sign-in');
  await page.getByLabel('Sign-in name').fill(OWNER.login);
  await page.getByLabel('Password').fill('not-the-password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByText('do not belong together')).toBeVisible();
  await page.getByLabel('Password').fill(OWNER.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).toHaveURL(/\/desk/);
  // The set-up page of a post that has an owner is not there.
  expect((await page.request.get(`${post.origin}/set-up`)).status()).toBe(404);
  await context.close();
});
