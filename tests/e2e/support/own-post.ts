import type { Browser, BrowserContext } from '@playwright/test';
import { expect, send } from './fixtures';
import type { RunningPost } from './post';

/** What a lead enters of a tester before the first tool comes, through the desk's own commands. */
export interface EnteredTester {
  testerId: string;
  benchId: string;
}

const day = (shiftDays: number): string =>
  new Date(Date.now() + shiftDays * 86_400_000).toISOString().slice(0, 10);

export const OWNER = { name: 'Odile Farrow', login: 'odile', password: 'lantern-on-the-wall' };
export const MEET = {
  name: 'Harrow Lea Open Day',
  place: 'Harrow Lea',
  slug: 'harrow-lea-open-day',
};

/** The first visit of an empty post: the one test of the set-up form and of the set-up code. */
export async function setUp(browser: Browser, post: RunningPost): Promise<BrowserContext> {
  const context = await browser.newContext({
    baseURL: post.origin,
    viewport: { width: 1366, height: 768 },
  });
  const page = await context.newPage();
  await page.goto('/');
  await expect(page).toHaveURL(/\/set-up$/);
  await page.getByLabel('Set-up code').fill('AAAA-AAAA');
  await page.getByLabel('Name of the post').fill('Harrow Lea Post');
  await page.getByLabel('Short name').fill('HL');
  await page.getByLabel('Your name').fill(OWNER.name);
  await page.getByLabel('Sign-in name').fill(OWNER.login);
  await page.getByLabel('Password').fill(OWNER.password);
  await page.getByLabel('Name of the meet').fill(MEET.name);
  await page.getByLabel('Place').fill(MEET.place);
  await page.getByLabel('First day').fill(day(-1));
  await page.getByLabel('Last day').fill(day(1));
  await page.getByLabel('Time zone').selectOption('Europe/London');
  await page.getByLabel('Benches').fill('2');
  const submit = page.getByRole('button', { name: 'Set up' });
  await submit.click();
  await expect(
    page
      .getByText(/code/i)
      .filter({ hasText: /not|wrong|another/i })
      .first(),
  ).toBeVisible();
  await page.getByLabel('Set-up code').fill(post.setupCode!);
  await page.getByLabel('Password').fill(OWNER.password);
  await submit.click();
  await expect(page).not.toHaveURL(/set-up/);
  await page.close();
  return context;
}

/**
 * A tester without error or drift, U = 0.2 % (k = 2), reading to 0.1 N·m, proved today at 100 N·m, on
 * bench 1: numbers that a verdict can be worked out from by hand.
 */
export async function enterTester(
  lead: BrowserContext,
  post: RunningPost,
  benchId: string,
  connection: Record<string, unknown>,
): Promise<EnteredTester> {
  const { testerId } = await send<{ testerId: string }>(lead, post, 'tester.add', {
    name: 'T-07',
    maker: 'Orrin & Vale',
    model: 'Standfast 500',
    serial: 'OV-5007',
    unit: 'N.m',
    min: 10,
    max: 500,
    resolution: 0.1,
    yearlyDriftPercent: 0,
    temperatureCoefficientPercentPerK: null,
    correctionApplied: false,
    connection,
  });
  await send(lead, post, 'certificate.add', {
    testerId,
    number: 'QL-2041',
    laboratory: 'Quillon Laboratory',
    accreditation: 'Q-118',
    issuedOn: day(-100),
    dueOn: day(265),
    traceability: 'To the SI through the national standard of torque',
    temperatureC: null,
    unit: 'N.m',
    points: [10, 100, 500].map((torque) => ({
      direction: 'cw',
      torque,
      errorPercent: 0,
      expandedPercent: 0.2,
      k: 2,
    })),
  });
  await send(lead, post, 'proof.add', {
    testerId,
    method: 'dead-weight',
    load: 100,
    reading: 100.1,
    unit: 'N.m',
    limitPercent: 0.5,
    note: '',
  });
  await send(lead, post, 'bench.set-tester', { benchId, testerId });
  return { testerId, benchId };
}
