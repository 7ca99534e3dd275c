import type { APIRequestContext, Page } from '@playwright/test';
import { tagCode } from '@/lib/line/code';
import type { FoundTag } from '@/lib/live/contract';
import type { TagState } from '@/lib/line/states';
import type { Verdict } from '@/lib/torque/verdict';
import { verdictWords } from '@/lib/torque/words';
import { linkToken } from '@/server/access/links';
import { BENCH_IDS, STAFF_IDS } from '@/server/rehearsal/ids';
import type { Person } from './fixtures';
import type { RunningPost } from './post';

export const MEET_PATH = '/m/quillmoor-autumn-meet';
export const BENCH_PATHS = BENCH_IDS.map((id) => `/bench/${id}`);

const asPerson = (staffId: string): Person => ({ staffId, sessionVersion: 1 });
export const PEOPLE = {
  owner: asPerson(STAFF_IDS.owner),
  lead: asPerson(STAFF_IDS.lead),
  operator: asPerson(STAFF_IDS.operator),
};

/** Every tag of the rehearsal's meet, in the order in which they joined. Asked as staff. */
export async function tagsOfMeet(staff: APIRequestContext, post: RunningPost): Promise<FoundTag[]> {
  const tags: FoundTag[] = [];
  for (let sequence = 1; ; sequence += 1) {
    const path = `/api/benches/${BENCH_IDS[0]}/tags/${tagCode(sequence)}`;
    const response = await staff.get(`${post.origin}${path}`);
    if (response.status() === 404) return tags;
    if (!response.ok()) throw new Error(`${path}: ${response.status()}`);
    tags.push(((await response.json()) as { tag: FoundTag }).tag);
  }
}

/**
 * The address of the ticket of the first tag in a state, and for which `suits` holds.
 * @throws Error when the meet has no such tag.
 */
export async function ticketIn(
  state: TagState,
  staff: APIRequestContext,
  post: RunningPost,
  suits: (tag: FoundTag) => boolean = () => true,
): Promise<string> {
  const tag = (await tagsOfMeet(staff, post)).find((one) => one.state === state && suits(one));
  if (!tag) throw new Error(`The rehearsal has no tag that is '${state}'.`);
  return `/t/${linkToken(post.secret(), 'ticket', tag.id, 1)}`;
}

/** The address of the newest result of a verdict, as a lead finds it at the desk. */
export async function resultOf(verdict: Verdict, desk: Page): Promise<string> {
  await desk.goto('/desk/records');
  const row = desk.getByRole('row').filter({ hasText: verdictWords(verdict) });
  return String(await row.first().getByRole('link').getAttribute('href'));
}

/** The address of the first tester at the desk. */
export async function firstTester(desk: Page): Promise<string> {
  await desk.goto('/desk/testers');
  return String(await desk.getByRole('link', { name: 'T-01' }).getAttribute('href'));
}
