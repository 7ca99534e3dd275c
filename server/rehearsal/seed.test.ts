import { verify } from '@node-rs/argon2';
import { asc, count, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { openStore, type Store } from '@/db/client';
import {
  benches,
  checks,
  commandRuns,
  ledger,
  pullDecisions,
  pulls,
  records,
  staff,
  tags,
  testerProofs,
  tools,
} from '@/db/schema';
import { TAG_STATES } from '@/lib/line/states';
import { serviceDay } from '@/lib/time/service-day';
import { VERDICTS } from '@/lib/torque/verdict';
import { testerToday } from '@/server/queries/tester/standing';
import { storeTemplate } from '@/tests/support/template';
import { ACCOUNTS, CREW } from './accounts';
import { openNewDay } from './new-day';
import { dayStartHour } from './place';
import { seed } from './seed';
import { settingOf } from './setting';

const NOW = new Date('2026-10-03T13:20:00Z');
const SECRET = 'a-secret-of-this-test-that-is-long-enough-0123456789';

/** A whole story takes seconds, more on a busy machine. */
const STORY_MS = 120_000;

const freshStore = async (): Promise<Store> =>
  openStore({ kind: 'dump', dump: await storeTemplate() });
const seedAt = (store: Store, now = NOW) => seed({ store, secret: SECRET, clock: () => now });

/** All that a rehearsal is told apart by, without the ids that commands make. */
async function storyOf({ db }: Store) {
  return {
    tags: await db
      .select({
        code: tags.code,
        state: tags.state,
        place: tags.place,
        peg: tags.peg,
        joinedAt: tags.joinedAt,
      })
      .from(tags)
      .orderBy(asc(tags.position)),
    records: await db
      .select({ number: records.number, verdict: records.verdict, signedAt: records.signedAt })
      .from(records)
      .orderBy(asc(records.sequence)),
    pulls: await db
      .select({ rawNm: pulls.rawNm, at: pulls.at, source: pulls.source })
      .from(pulls)
      .orderBy(asc(pulls.at), asc(pulls.sequence)),
    entries: (await db.select({ entries: count() }).from(ledger))[0]!.entries,
    runs: (await db.select({ runs: count() }).from(commandRuns))[0]!.runs,
  };
}

describe('the rehearsal’s story', () => {
  let store: Store;
  beforeAll(async () => {
    store = await freshStore();
    await seedAt(store);
  }, STORY_MS);

  it('shows every state of a tag and every verdict', async () => {
    const { tags: told, records: signed } = await storyOf(store);
    expect(new Set(told.map(({ state }) => state))).toEqual(new Set(TAG_STATES));
    expect(new Set(signed.map(({ verdict }) => verdict))).toEqual(new Set(VERDICTS));
    expect(told.filter(({ state }) => state === 'waiting').length).toBeGreaterThanOrEqual(6);
    expect(told.some(({ state, place }) => state === 'waiting' && place === 'peg')).toBe(true);
    expect(told.some(({ state, place }) => state === 'ready' && place === 'peg')).toBe(true);
    const held = await store.db.select({ until: tags.heldUntil }).from(tags);
    expect(held.filter(({ until }) => until !== null && until > NOW)).toHaveLength(1);
  });

  it('has a check half done on the first bench, and nobody at the benches', async () => {
    const half = await store.db
      .select({ bench: benches.number, id: checks.id, steps: checks.plan })
      .from(checks)
      .innerJoin(benches, eq(benches.id, checks.benchId))
      .where(eq(checks.state, 'running'));
    expect(half.map(({ bench }) => bench)).toEqual([1]);
    const readings = await store.db
      .select()
      .from(pullDecisions)
      .where(eq(pullDecisions.checkId, half[0]!.id));
    expect(readings.length).toBeGreaterThan(6);
    expect(readings.length).toBeLessThan(half[0]!.steps.steps.length);
    const taken = await store.db.select({ by: benches.operatorId }).from(benches);
    expect(taken).toEqual([{ by: null }, { by: null }]);
  });

  it('has the records that screens must be able to show', async () => {
    const rows = await store.db.select().from(records);
    const signed = rows.map(({ canonical }) => JSON.parse(canonical));
    const has = (what: (record: (typeof signed)[number]) => boolean) => signed.some(what);
    expect(has(({ barred }) => barred.includes('not-proved-today'))).toBe(true);
    expect(
      has(({ evaluation }) =>
        evaluation.points.some((point: { reasons: { code: string }[] }) =>
          point.reasons.some(({ code }) => code === 'reference-too-coarse'),
        ),
      ),
    ).toBe(true);
    expect(has(({ plan }) => plan.scheme === 'short')).toBe(true);
    expect(has(({ plan }) => plan.scheme === 'working')).toBe(true);
    expect(has(({ plan }) => !plan.setting)).toBe(true);
    expect(
      has(({ plan }) => plan.points.some((p: { direction: string }) => p.direction === 'ccw')),
    ).toBe(true);
    expect(has((record) => record.stoppedEarly && record.stopReason)).toBe(true);
    expect(has((record) => record.notes.length > 0)).toBe(true);
    expect(has((record) => record.pulls.some((p: { state: string }) => p.state === 'voided'))).toBe(
      true,
    );
    const classes = await store.db.selectDistinct({ toolClass: tools.toolClass }).from(tools);
    expect(classes.length).toBeGreaterThanOrEqual(9);
  });

  it('lies in the last hours of today, in the order in which it happened', async () => {
    const { meet, benches: both } = await settingOf(store.db);
    const today = serviceDay(NOW, meet.timeZone, meet.dayStartHour);
    expect(meet.startsOn).toBe(today);
    const entries = await store.db
      .select({ at: ledger.at })
      .from(ledger)
      .orderBy(asc(ledger.sequence));
    const times = entries.map(({ at }) => at.getTime());
    expect(times).toEqual([...times].sort((one, other) => one - other));
    expect(times.at(-1)).toBeLessThanOrEqual(NOW.getTime());
    expect(serviceDay(entries[0]!.at, meet.timeZone, meet.dayStartHour)).toBe(today);
    for (const { testerId } of both) {
      expect((await testerToday(store.db, testerId!, meet, NOW))?.barred).toEqual([]);
    }
  });

  it('lets people sign in with the printed passwords, and nobody as the crew', async () => {
    const people = await store.db.select().from(staff);
    for (const { login, password, role } of ACCOUNTS) {
      const person = people.find((one) => one.login === login)!;
      expect(person.role).toBe(role);
      expect(person.passwordHash).toMatch(/^\$argon2id\$/);
      expect(await verify(person.passwordHash, password)).toBe(true);
    }
    const member = people.find(({ login }) => login === CREW[0]!.login)!;
    for (const { password } of ACCOUNTS) {
      expect(await verify(member.passwordHash, password)).toBe(false);
    }
  });

  it('is told once: a second seed changes nothing', async () => {
    const before = await storyOf(store);
    await seedAt(store, new Date(NOW.getTime() + 3_600_000));
    expect(await storyOf(store)).toEqual(before);
  });

  it(
    'goes on where it was cut short, and ends as every other rehearsal does',
    async () => {
      const other = await freshStore();
      let commands = 0;
      const cut = Object.create(other.db, {
        transaction: {
          value: (...args: Parameters<typeof other.db.transaction>) => {
            commands += 1;
            if (commands > 150) throw new Error('power cut');
            return other.db.transaction(...args);
          },
        },
      });
      await expect(
        seed({ store: { ...other, db: cut }, secret: SECRET, clock: () => NOW }),
      ).rejects.toThrow('power cut');
      await seedAt(other, new Date(NOW.getTime() + 60_000));
      expect(await storyOf(other)).toEqual(await storyOf(store));
      await other.close();
    },
    STORY_MS,
  );

  it('opens again on a later day, with its testers proved and its meet still on', async () => {
    const later = new Date(NOW.getTime() + 5 * 86_400_000);
    const stage = { db: store.db, secret: SECRET, clock: () => later, publish: () => undefined };
    const proofs = async () => (await store.db.select().from(testerProofs)).length;
    const before = await proofs();
    await openNewDay(stage);
    const { meet, benches: both } = await settingOf(store.db);
    expect(meet.endsOn >= serviceDay(later, meet.timeZone, meet.dayStartHour)).toBe(true);
    for (const { testerId } of both) {
      expect((await testerToday(store.db, testerId!, meet, later))?.barred).toEqual([]);
    }
    expect(await proofs()).toBe(before + 2);
    await openNewDay(stage);
    expect(await proofs()).toBe(before + 2);
    await store.close();
  });
});

describe('dayStartHour', () => {
  it('begins the day at least three hours before any hour of the day', () => {
    for (let hour = 0; hour < 24; hour += 1) {
      const now = new Date(Date.UTC(2026, 0, 15, hour, 1));
      const start = dayStartHour(now);
      const before = new Date(now.getTime() - 180 * 60_000);
      expect(serviceDay(before, 'Europe/London', start)).toBe(
        serviceDay(now, 'Europe/London', start),
      );
    }
  });
});
