import { mkdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { chromium, type Browser, type BrowserContext, type Page } from '@playwright/test';
import type { FoundTag } from '@/lib/live/contract';
import { BENCH_IDS } from '@/server/rehearsal/ids';
import { firstTester, MEET_PATH, PEOPLE, resultOf, ticketIn } from '@/tests/e2e/support/addresses';
import { benchStory } from '@/tests/e2e/support/bench-story';
import { SCREENS, send, signIn, type Person } from '@/tests/e2e/support/fixtures';
import { startPost, type RunningPost } from '@/tests/e2e/support/post';

const FOLDER = path.join(import.meta.dirname, '../docs/pictures');
const CHROMIUM = process.env.CHROMIUM || '/usr/bin/chromium';
/** The contact sheet: these, side by side on the chalk ground. */
const SHEET = ['ticket-waiting', 'ticket-called', 'result-within', 'result-outside'];
const SHEET_GAP = 30;
/** What the pictures' QR codes carry: an address as a post has it on its own network. */
const ORIGIN = 'http://192.168.4.1:3000';

/** Takes what the window shows once letters and first data are there. */
async function take(page: Page, name: string, { fullPage = false } = {}): Promise<void> {
  await page.waitForLoadState('networkidle');
  await page.evaluate(() => document.fonts.ready);
  const file = path.join(FOLDER, `${name}.png`);
  await page.screenshot({ path: file, animations: 'disabled', fullPage });
  console.log(name);
}

/** A window of its own at the size of its kind, signed in as somebody or as nobody. */
async function open(
  browser: Browser,
  post: RunningPost,
  kind: keyof typeof SCREENS,
  person?: Person,
): Promise<{ context: BrowserContext; page: Page }> {
  const context = await browser.newContext({
    viewport: SCREENS[kind],
    baseURL: post.origin,
    reducedMotion: 'reduce',
  });
  if (person) await signIn(context, post, person);
  return { context, page: await context.newPage() };
}

async function visitorPictures(browser: Browser, post: RunningPost): Promise<void> {
  const { page: desk, context: staff } = await open(browser, post, 'desk', PEOPLE.lead);
  const { page: phone } = await open(browser, post, 'phone');
  const show = async (name: string, address: string) => {
    await phone.goto(address);
    await take(phone, name);
  };
  await show('front-door', '/');
  await show('join', `${MEET_PATH}/join`);
  for (const state of ['waiting', 'called', 'on_bench', 'ready', 'away', 'returned'] as const) {
    const name = `ticket-${state.replace('_', '-')}`;
    // Of those who wait, somebody who walks about with the tool.
    const suits = (tag: FoundTag) =>
      state !== 'waiting' || (tag.place === 'visitor' && tag.heldUntil === null);
    await show(name, await ticketIn(state, staff.request, post, suits));
  }
  for (const verdict of ['within', 'outside', 'too-close', 'not-judged'] as const) {
    await show(`result-${verdict}`, await resultOf(verdict, desk));
  }
  const { page: board } = await open(browser, post, 'board');
  await board.goto(`${MEET_PATH}/board`);
  await take(board, 'board');
  await desk.goto(`${MEET_PATH}/poster`);
  await take(desk, 'poster', { fullPage: true });
}

async function deskPictures(browser: Browser, post: RunningPost): Promise<void> {
  const { page: stranger } = await open(browser, post, 'desk');
  await stranger.goto('/sign-in');
  await take(stranger, 'sign-in');
  const { page: desk } = await open(browser, post, 'desk', PEOPLE.owner);
  const tester = await firstTester(desk);
  const addresses = {
    'desk-records': '/desk/records',
    'desk-audit': '/desk/audit',
    'desk-benches': '/desk/benches',
    'desk-testers': '/desk/testers',
    'desk-tester': tester,
    'desk-certificate': `${tester}/certificate`,
    'desk-plans': '/desk/plans',
    'desk-meets': '/desk/meets',
    'desk-staff': '/desk/staff',
  };
  for (const [name, address] of Object.entries(addresses)) {
    await desk.goto(address);
    await take(desk, name);
  }
}

/** The bench, and the desk while somebody stands at both. */
async function benchPictures(browser: Browser, post: RunningPost): Promise<void> {
  const { page: desk, context: lead } = await open(browser, post, 'desk', PEOPLE.lead);
  const { page: bench } = await open(browser, post, 'bench', PEOPLE.operator);
  await benchStory(bench, async (scene) => {
    await take(bench, scene);
    if (scene !== 'bench-pulling') return;
    await send(lead, post, 'bench.take', { benchId: BENCH_IDS[1] });
    await desk.goto('/desk');
    await take(desk, 'desk-line');
  });
}

async function contactSheet(browser: Browser): Promise<void> {
  const { width, height } = SCREENS.phone;
  const page = await browser.newPage({
    viewport: { width: SHEET.length * (width + SHEET_GAP) - SHEET_GAP, height },
  });
  const images = SHEET.map((name) => {
    const png = readFileSync(path.join(FOLDER, `${name}.png`)).toString('base64');
    return `<img alt="" src="data:image/png;base64,${png}">`;
  });
  await page.setContent(
    `<body style="margin:0;display:flex;gap:${SHEET_GAP}px;background:#fff">${images.join('')}</body>`,
  );
  await take(page, 'phones');
}

async function onPost(flags: string[], work: (post: RunningPost) => Promise<void>): Promise<void> {
  const post = await startPost({ flags, origin: ORIGIN });
  try {
    await work(post);
  } finally {
    await post.stop();
  }
}

mkdirSync(FOLDER, { recursive: true });
const browser = await chromium.launch({ executablePath: CHROMIUM, args: ['--no-sandbox'] });
try {
  await onPost(['--rehearsal'], async (post) => {
    await visitorPictures(browser, post);
    await deskPictures(browser, post);
    await benchPictures(browser, post);
  });
  await onPost([], async (post) => {
    const { page } = await open(browser, post, 'desk');
    await page.goto('/set-up');
    await take(page, 'set-up');
  });
  await contactSheet(browser);
} finally {
  await browser.close();
}
