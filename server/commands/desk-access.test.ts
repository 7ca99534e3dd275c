import { beforeEach, describe, expect, it } from 'vitest';
import type { Actor, Standing } from '@/server/access/actor';
import { ledger, staff } from '@/db/schema';
import { DEFAULT_PLAN_SETTINGS } from '@/lib/torque/settings';
import {
  actorOf,
  fixedId,
  makeStaff,
  makeWorld,
  TEST_PASSWORD_HASH,
  TEST_POINTS,
} from '@/tests/support/factories';
import { testStore } from '@/tests/support/store';
import { addBench } from './bench/add';
import { setBenchTester } from './bench/set-tester';
import { addCertificate } from './certificate/add';
import type { CommandContext } from './command';
import { changeMeet } from './meet/change';
import { createMeet } from './meet/create';
import { changePlan } from './plan/change';
import { addProof } from './proof/add';
import { setUpPost } from './post/set-up';
import { signIn } from './session/sign-in';
import { signOut } from './session/sign-out';
import { addStaff } from './staff/add';
import { changeStaff } from './staff/change';
import { setPassword } from './staff/set-password';
import { addTester } from './tester/add';
import { changeTester } from './tester/change';
import { lockTester } from './tester/lock';

const meet = {
  name: 'Spring Meet',
  place: 'Long Acre',
  startsOn: '2026-07-03',
  endsOn: '2026-07-05',
  timeZone: 'Europe/London',
  benches: 2,
};
const tester = {
  name: 'T-09',
  maker: 'Harrowgate',
  model: 'HX 200',
  serial: 'HX-0009',
  unit: 'N.m' as const,
  min: 4,
  max: 200,
  resolution: 0.05,
  yearlyDriftPercent: 0.2,
  correctionApplied: false,
  connection: { kind: 'keyed' as const },
};
const meetId = fixedId('meet');
const testerId = fixedId('tester');
const staffId = fixedId('staff', 1);

const STANDINGS: Standing[] = ['public', 'visitor', 'tester', 'job', 'operator', 'lead', 'owner'];
const LEADS: Standing[] = ['lead', 'owner'];

type Call = (ctx: CommandContext) => Promise<unknown>;
const id = fixedId('call');

/** Each command with an input that works, and everybody who may. */
const COMMANDS: { name: string; call: Call; allowed: Standing[] }[] = [
  { name: 'session.sign-in', call: (ctx) => signIn(ctx, id, { staffId }), allowed: ['public'] },
  {
    name: 'session.sign-out',
    call: (ctx) => signOut(ctx, id, {}),
    allowed: ['operator', 'lead', 'owner'],
  },
  {
    name: 'staff.add',
    call: (ctx) =>
      addStaff(ctx, id, {
        name: 'Ada Fell',
        login: 'ada',
        role: 'operator',
        passwordHash: TEST_PASSWORD_HASH,
      }),
    allowed: ['owner'],
  },
  {
    name: 'staff.change',
    call: (ctx) => changeStaff(ctx, id, { staffId, active: false }),
    allowed: ['owner'],
  },
  {
    name: 'staff.set-password',
    call: (ctx) => setPassword(ctx, id, { staffId, passwordHash: TEST_PASSWORD_HASH }),
    allowed: ['owner'],
  },
  { name: 'meet.create', call: (ctx) => createMeet(ctx, id, meet), allowed: LEADS },
  {
    name: 'meet.change',
    call: (ctx) => changeMeet(ctx, id, { meetId, joinOpen: false }),
    allowed: LEADS,
  },
  { name: 'bench.add', call: (ctx) => addBench(ctx, id, { meetId }), allowed: LEADS },
  {
    name: 'bench.set-tester',
    call: (ctx) => setBenchTester(ctx, id, { benchId: fixedId('bench', 1), testerId: null }),
    allowed: LEADS,
  },
  {
    name: 'plan.change',
    call: (ctx) =>
      changePlan(ctx, id, {
        meetId,
        scheme: 'short',
        basis: 'set',
        guard: DEFAULT_PLAN_SETTINGS.guard,
      }),
    allowed: LEADS,
  },
  { name: 'tester.add', call: (ctx) => addTester(ctx, id, tester), allowed: LEADS },
  {
    name: 'tester.change',
    call: (ctx) => changeTester(ctx, id, { testerId, tester }),
    allowed: LEADS,
  },
  {
    name: 'tester.lock',
    call: (ctx) => lockTester(ctx, id, { testerId, reason: 'Dropped.' }),
    allowed: LEADS,
  },
  {
    name: 'certificate.add',
    call: (ctx) =>
      addCertificate(ctx, id, {
        testerId,
        number: 'C-2',
        laboratory: 'Quern Laboratory',
        accreditation: 'Q-0042',
        issuedOn: '2026-06-01',
        dueOn: '2027-06-01',
        traceability: 'To the SI',
        unit: 'N.m',
        points: TEST_POINTS.map(({ torqueNm, ...rest }) => ({ ...rest, torque: torqueNm })),
      }),
    allowed: LEADS,
  },
  {
    name: 'proof.add',
    call: (ctx) =>
      addProof(ctx, id, {
        testerId,
        method: 'dead-weight',
        load: 100,
        reading: 100.2,
        unit: 'N.m',
        limitPercent: 0.5,
      }),
    allowed: LEADS,
  },
];

describe('who may run the commands of the desk', async () => {
  const store = await testStore();
  let world: Awaited<ReturnType<typeof makeWorld>>;
  beforeEach(async () => {
    await store.reset();
    world = await makeWorld(store.db);
  });

  const actorFor = (standing: Standing): Actor => {
    if (standing === 'public') return { kind: 'public' };
    if (standing === 'visitor') return { kind: 'visitor', tagId: world.tag.id };
    if (standing === 'tester') return { kind: 'tester', testerId: world.tester.id };
    if (standing === 'job') return { kind: 'job', name: 'nightly' };
    return actorOf(world.staff[standing]);
  };

  for (const { name, call, allowed } of COMMANDS) {
    it.each(STANDINGS)(`${name} by %s`, async (standing) => {
      const outcome = call(store.contextFor(actorFor(standing)));
      if (allowed.includes(standing)) {
        await expect(outcome).resolves.toBeTruthy();
        const entries = await store.db.select().from(ledger);
        expect(entries.map(({ command }) => command)).toEqual([name]);
        return;
      }
      await expect(outcome).rejects.toMatchObject({
        code: standing === 'public' ? 'sign-in' : 'forbidden',
      });
      expect(await store.db.select().from(ledger)).toEqual([]);
      expect(store.published).toEqual([]);
    });

    it(`${name} with a session that has ended`, async () => {
      await makeStaff(store.db, 'owner', {
        id: fixedId('staff', 9),
        login: 'former',
        active: false,
        sessionVersion: 2,
      });
      for (const sessionVersion of [1, 2]) {
        const former: Actor = { kind: 'staff', staffId: fixedId('staff', 9), sessionVersion };
        await expect(call(store.contextFor(former))).rejects.toMatchObject({ code: 'sign-in' });
      }
      const stale: Actor = { kind: 'staff', staffId: world.staff.owner.id, sessionVersion: 0 };
      await expect(call(store.contextFor(stale))).rejects.toMatchObject({ code: 'sign-in' });
    });
  }

  it('post.set-up is for the public of an empty post alone', async () => {
    const input = {
      post: { name: 'Test Post', shortName: 'tp' },
      owner: { name: 'Oswin Hale', login: 'Oswin', passwordHash: TEST_PASSWORD_HASH },
      meet,
    };
    for (const standing of STANDINGS.filter((one) => one !== 'public')) {
      await expect(
        setUpPost(store.contextFor(actorFor(standing)), id, input),
      ).rejects.toMatchObject({
        code: 'forbidden',
      });
    }
    await expect(setUpPost(store.contextFor({ kind: 'public' }), id, input)).rejects.toMatchObject({
      code: 'wrong-move',
    });
    expect(await store.db.select().from(staff)).toHaveLength(3);
  });
});
