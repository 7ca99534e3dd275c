import {
  test as base,
  expect,
  type Browser,
  type BrowserContext,
  type Page,
} from '@playwright/test';
import { sealData } from 'iron-session';
import { v7 as uuidv7 } from 'uuid';
import { SESSION_COOKIE } from '@/server/access/session';
import { startPost, type RunningPost } from './post';

export { expect };

/** The screens of the four kinds of people, at their own sizes. */
export const SCREENS = {
  phone: { width: 390, height: 844 },
  bench: { width: 1366, height: 768 },
  board: { width: 1920, height: 1080 },
  desk: { width: 1366, height: 768 },
} as const;

export interface Person {
  staffId: string;
  sessionVersion: number;
}

/** Every console error and uncaught exception of a page fails its test. */
export function watch(page: Page, errors: string[], allowed: RegExp[] = []): void {
  const note = (text: string) => {
    if (!allowed.some((pattern) => pattern.test(text))) errors.push(`${page.url()}: ${text}`);
  };
  page.on('console', (message) => message.type() === 'error' && note(message.text()));
  page.on('pageerror', (error) => note(error.message));
}

/** Signs a context in without the form, with a cookie sealed by the post's own secret. */
export async function signIn(
  context: BrowserContext,
  post: RunningPost,
  person: Person,
): Promise<void> {
  const value = await sealData(person, { password: post.secret().slice(0, 64), ttl: 12 * 3600 });
  await context.addCookies([
    { name: SESSION_COOKIE, value, url: post.origin, httpOnly: true, sameSite: 'Lax' },
  ]);
}

/** Sends a command as the person of the context, as a staff screen does. */
export async function send<Result = Record<string, unknown>>(
  context: BrowserContext,
  post: RunningPost,
  name: string,
  input: unknown,
): Promise<Result> {
  const response = await context.request.post(`${post.origin}/api/commands/${name}`, {
    data: { id: uuidv7(), input },
  });
  const body = (await response.json()) as { result: Result };
  if (!response.ok()) throw new Error(`${name}: ${JSON.stringify(body)}`);
  return body.result;
}

interface Windows {
  /** Opens a window of its own (cookies apart) at the size of its kind. */
  open(
    kind: keyof typeof SCREENS,
    options?: { person?: Person; javaScript?: boolean },
  ): Promise<Page>;
  errors: string[];
}

async function windowsOn(
  browser: Browser,
  post: () => RunningPost,
  work: (windows: Windows) => Promise<void>,
) {
  const contexts: BrowserContext[] = [];
  const errors: string[] = [];
  await work({
    errors,
    async open(kind, { person, javaScript = true } = {}) {
      const context = await browser.newContext({
        viewport: SCREENS[kind],
        baseURL: post().origin,
        javaScriptEnabled: javaScript,
        reducedMotion: 'reduce',
      });
      contexts.push(context);
      if (person) await signIn(context, post(), person);
      const page = await context.newPage();
      watch(page, errors);
      return page;
    },
  });
  for (const context of contexts) await context.close();
  expect(errors, 'console errors').toEqual([]);
}

/** Tests on one rehearsal, seeded once for the file. */
export const test = base.extend<
  { windows: Windows },
  { post: RunningPost; flags: string[]; apart: string }
>({
  flags: [['--rehearsal'], { option: true, scope: 'worker' }],
  // A file that must find the story as it was seeded names itself here, and gets a post of its own.
  apart: ['', { option: true, scope: 'worker' }],
  post: [
    async ({ flags }, use) => {
      const post = await startPost({ flags });
      await use(post);
      await post.stop();
    },
    { scope: 'worker', timeout: 120_000 },
  ],
  windows: async ({ browser, post }, use) => windowsOn(browser, () => post, use),
});
