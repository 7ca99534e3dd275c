import { eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { benches, meets, posts, staff, tags, tools, visitors } from '@/db/schema';
import { tagCode } from '@/lib/line/code';
import type { Role } from '@/lib/line/states';
import { DEFAULT_PLAN_SETTINGS } from '@/lib/torque/settings';
import type { Actor } from '@/server/access/actor';
import { hashToken, linkToken } from '@/server/access/links';
import { fixedId } from './ids';
import { TEST_NOW, TEST_SECRET } from './store';
import { makeCertificate, makeProof, makeTester } from './tester-factories';

export { fixedId } from './ids';
export { makeCertificate, makeProof, makeTester, TEST_POINTS } from './tester-factories';

/** What the staff of tests sign in with; `TEST_PASSWORD_HASH` is its argon2id hash. */
export const TEST_PASSWORD = 'quiet-paddock-42';
export const TEST_PASSWORD_HASH =
  '$argon2id$v=19$m=19456,t=2,p=1$/8+RpFJpBPxbQ+P3qfUW8Q$KneVGbau7qE0AflJxn7D1Xr04Y0l/Mr9lj7VHBk8c3I';

type Insert<Table extends { $inferInsert: object }> = Partial<Table['$inferInsert']>;

const createdAt = new Date('2026-06-01T12:00:00Z');

export async function makePost(db: Database, values: Insert<typeof posts> = {}) {
  const [post] = await db
    .insert(posts)
    .values({ id: fixedId('post'), name: 'Test Post', shortName: 'TP', createdAt, ...values })
    .returning();
  return post!;
}

const STAFF_NUMBER: Record<Role, number> = { operator: 1, lead: 2, owner: 3 };
const STAFF_NAME: Record<Role, string> = {
  operator: 'Olive Pike',
  lead: 'Lena Marsh',
  owner: 'Oswin Hale',
};

/** A person of this role, who signs in as `operator`, `lead` or `owner`. */
export async function makeStaff(db: Database, role: Role, values: Insert<typeof staff> = {}) {
  const [person] = await db
    .insert(staff)
    .values({
      id: fixedId('staff', STAFF_NUMBER[role]),
      postId: fixedId('post'),
      name: STAFF_NAME[role],
      login: role,
      passwordHash: TEST_PASSWORD_HASH,
      role,
      createdAt,
      ...values,
    })
    .returning();
  return person!;
}

/** The actor that a signed-in person acts as. */
export const actorOf = (person: { id: string; sessionVersion: number }): Actor => ({
  kind: 'staff',
  staffId: person.id,
  sessionVersion: person.sessionVersion,
});

/** A meet of three days around `TEST_NOW`, with its benches, numbered from 1. */
export async function makeMeet(
  db: Database,
  values: Insert<typeof meets> & { benches?: number } = {},
) {
  const { benches: benchCount = 2, ...rest } = values;
  const [meet] = await db
    .insert(meets)
    .values({
      id: fixedId('meet'),
      postId: fixedId('post'),
      slug: 'test-meet',
      name: 'Test Meet',
      place: 'Fallow Field',
      startsOn: '2026-06-12',
      endsOn: '2026-06-14',
      timeZone: 'Europe/London',
      latitudeDeg: 52.1,
      heightM: 90,
      planSettings: DEFAULT_PLAN_SETTINGS,
      createdAt,
      ...rest,
    })
    .returning();
  if (benchCount === 0) return { meet: meet!, benches: [] };
  const rows = await db
    .insert(benches)
    .values(
      Array.from({ length: benchCount }, (_, index) => ({
        id: fixedId('bench', index + 1),
        meetId: meet!.id,
        number: index + 1,
      })),
    )
    .returning();
  return { meet: meet!, benches: rows };
}

/** A waiting click wrench, 60–340 N·m, with its visitor. `number` also gives its code and place. */
export async function makeTag(
  db: Database,
  number = 1,
  values: Insert<typeof tags> & {
    tool?: Insert<typeof tools>;
    visitor?: Insert<typeof visitors>;
  } = {},
) {
  const { tool: toolValues, visitor: visitorValues, ...rest } = values;
  const id = fixedId('tag', number);
  const toolId = fixedId('tool', number);
  const visitorId = fixedId('visitor', number);
  await db.insert(visitors).values({ id: visitorId, createdAt, ...visitorValues });
  await db.insert(tools).values({
    id: toolId,
    toolClass: 'II-A',
    rangeMin: 60,
    rangeMax: 340,
    unit: 'N.m',
    division: 2,
    claim: { of: 'reading', cwPercent: 4, ccwPercent: null },
    createdAt,
    ...toolValues,
  });
  const [tag] = await db
    .insert(tags)
    .values({
      id,
      meetId: fixedId('meet'),
      code: tagCode(number),
      toolId,
      visitorId,
      state: 'waiting',
      place: 'visitor',
      position: number,
      consent: 'maximum',
      ticketHash: hashToken(linkToken(TEST_SECRET, 'ticket', id, 1)),
      joinedAt: new Date(TEST_NOW.getTime() - 20 * 60_000),
      ...rest,
    })
    .returning();
  return tag!;
}

/** The address token of a tag's ticket. */
export const ticketOf = (tag: { id: string }): string =>
  linkToken(TEST_SECRET, 'ticket', tag.id, 1);

/**
 * A post that can work: everybody of the staff, a meet with two benches, a certified and proved
 * tester on bench 1, and tag A01 waiting.
 */
export async function makeWorld(db: Database) {
  const post = await makePost(db);
  const operator = await makeStaff(db, 'operator');
  const lead = await makeStaff(db, 'lead');
  const owner = await makeStaff(db, 'owner');
  const tester = await makeTester(db);
  const certificate = await makeCertificate(db);
  const proof = await makeProof(db);
  const { meet, benches: benchRows } = await makeMeet(db);
  const [bench, otherBench] = benchRows;
  await db.update(benches).set({ testerId: tester.id }).where(eq(benches.id, bench!.id));
  // The meet has given out the code of the one tag.
  await db.update(meets).set({ tagsIssued: 1 }).where(eq(meets.id, meet.id));
  const tag = await makeTag(db);
  return {
    post,
    staff: { operator, lead, owner },
    tester,
    certificate,
    proof,
    meet: { ...meet, tagsIssued: 1 },
    bench: { ...bench!, testerId: tester.id },
    otherBench: otherBench!,
    tag,
  };
}
