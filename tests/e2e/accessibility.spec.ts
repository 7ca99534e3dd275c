import type { Page } from '@playwright/test';
import { VERDICTS } from '@/lib/torque/verdict';
import { TAG_STATES } from '@/lib/line/states';
import { MEET_ID, STAFF_IDS } from '@/server/rehearsal/ids';
import { expectNoViolation } from './support/accessible';
import {
  BENCH_PATHS,
  firstTester,
  MEET_PATH,
  PEOPLE,
  resultOf,
  ticketIn,
} from './support/addresses';
import { benchStory } from './support/bench-story';
import { expect, SCREENS, test, type Person } from './support/fixtures';

interface Screen {
  name: string;
  kind: keyof typeof SCREENS;
  path: string;
  person?: Person;
  /** What is done on the page before it is looked at. */
  act?: (page: Page) => Promise<void>;
  /** The status when it is not 200: what the browser's console says of it is no fault. */
  status?: 403 | 404;
}

const JOIN = `${MEET_PATH}/join`;

const openAll = (page: Page): Promise<void> =>
  page
    .locator('details')
    .evaluateAll((all) => all.forEach((one) => ((one as HTMLDetailsElement).open = true)));

async function sendEmpty(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Join the line' }).click();
  await expect(page.locator('[aria-invalid="true"]').first()).toBeVisible();
}

async function openSheet(page: Page): Promise<void> {
  await page
    .getByRole('table')
    .getByRole('button', { name: /[A-Y]\d\d/ })
    .first()
    .click();
  await expect(page.getByRole('button', { name: /close/i })).toBeVisible();
  await openAll(page);
}

const { lead, owner, operator } = PEOPLE;
const SCREENS_SEEN: Screen[] = [
  { name: 'front door', kind: 'phone', path: '/' },
  { name: 'join', kind: 'phone', path: JOIN },
  { name: 'join with every part open', kind: 'phone', path: JOIN, act: openAll },
  { name: 'join with errors', kind: 'phone', path: JOIN, act: sendEmpty },
  { name: 'board', kind: 'board', path: `${MEET_PATH}/board` },
  { name: 'poster', kind: 'desk', path: `${MEET_PATH}/poster` },
  { name: 'sign-in', kind: 'desk', path: '/sign-in' },
  { name: 'bench of nobody', kind: 'bench', path: BENCH_PATHS[1]!, person: operator },
  { name: 'desk', kind: 'desk', path: '/desk', person: lead },
  { name: 'desk, a tag open', kind: 'desk', path: '/desk', person: lead, act: openSheet },
  { name: 'desk, records', kind: 'desk', path: '/desk/records', person: lead },
  { name: 'desk, audit', kind: 'desk', path: '/desk/audit', person: lead },
  { name: 'desk, meets', kind: 'desk', path: '/desk/meets', person: lead },
  { name: 'desk, new meet', kind: 'desk', path: '/desk/meets/new', person: lead },
  { name: 'desk, meet', kind: 'desk', path: `/desk/meets/${MEET_ID}`, person: lead },
  { name: 'desk, benches', kind: 'desk', path: '/desk/benches', person: lead },
  { name: 'desk, testers', kind: 'desk', path: '/desk/testers', person: lead },
  { name: 'desk, new tester', kind: 'desk', path: '/desk/testers/new', person: lead },
  { name: 'desk, plans', kind: 'desk', path: '/desk/plans', person: lead },
  { name: 'desk, staff', kind: 'desk', path: '/desk/staff', person: owner },
  {
    name: 'desk, person',
    kind: 'desk',
    path: `/desk/staff/${STAFF_IDS.operator}`,
    person: owner,
  },
  { name: 'not allowed', kind: 'desk', path: '/desk/staff', person: operator, status: 403 },
  { name: 'not found', kind: 'phone', path: '/nowhere', status: 404 },
  { name: 'no such ticket', kind: 'phone', path: `/t/${'A'.repeat(43)}`, status: 404 },
];

for (const { name, kind, path, person, act, status = 200 } of SCREENS_SEEN) {
  test(`accessible: ${name}`, async ({ windows }) => {
    const page = await windows.open(kind, person ? { person } : {});
    const response = await page.goto(path);
    expect(response?.status()).toBe(status);
    await act?.(page);
    await expectNoViolation(page);
    if (status !== 200) windows.errors.length = 0;
  });
}

for (const state of TAG_STATES) {
  test(`accessible: ticket, ${state}`, async ({ windows, post }) => {
    const staff = await windows.open('desk', { person: lead });
    const phone = await windows.open('phone');
    await phone.goto(await ticketIn(state, staff.request, post));
    await openAll(phone);
    await expectNoViolation(phone);
  });
}

for (const verdict of VERDICTS) {
  test(`accessible: result, ${verdict}`, async ({ windows }) => {
    const desk = await windows.open('desk', { person: lead });
    const phone = await windows.open('phone');
    await phone.goto(await resultOf(verdict, desk));
    await openAll(phone);
    await expectNoViolation(phone);
  });
}

for (const part of ['', '/change', '/certificate']) {
  test(`accessible: desk, tester${part}`, async ({ windows }) => {
    const desk = await windows.open('desk', { person: lead });
    await desk.goto(`${await firstTester(desk)}${part}`);
    await openAll(desk);
    await expectNoViolation(desk);
  });
}

test('accessible: a bench from a check that runs to the next start form', async ({ windows }) => {
  test.setTimeout(240_000);
  const bench = await windows.open('bench', { person: operator });
  const seen: string[] = [];
  await benchStory(bench, async (scene) => {
    await expectNoViolation(bench, scene);
    seen.push(scene);
  });
  expect(seen).toHaveLength(12);
  // The wrong code at the hand-back is refused on purpose.
  const onPurpose = windows.errors.filter((error) => error.includes('409 (Conflict)'));
  expect(onPurpose).toHaveLength(1);
  windows.errors.splice(windows.errors.indexOf(onPurpose[0]!), 1);
});
