import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { certificates, testerProofs, testers } from '@/db/schema';
import { actorOf, fixedId, makeTester, makeWorld } from '@/tests/support/factories';
import { checkOnBench } from '@/tests/support/line';
import { TEST_NOW, testStore } from '@/tests/support/store';
import { addCertificate } from '../certificate/add';
import { signOff } from '../check/sign-off';
import { stopEarly } from '../check/stop-early';
import { addProof } from '../proof/add';
import { addTester } from './add';
import { changeTester } from './change';
import { lockTester } from './lock';

const call = (number: number) => fixedId('call', number);
const testerId = fixedId('tester');
const DAY_MS = 86_400_000;

const description = {
  name: 'T-01',
  maker: 'Harrowgate',
  model: 'HX 500',
  serial: 'HX-0001',
  unit: 'N.m' as const,
  min: 10,
  max: 500,
  resolution: 0.1,
  yearlyDriftPercent: 0.2,
  temperatureCoefficientPercentPerK: 0.01,
  correctionApplied: false,
  connection: { kind: 'keyed' as const },
};
const proof = {
  testerId,
  method: 'dead-weight' as const,
  load: 100,
  reading: 100.2,
  unit: 'N.m' as const,
  limitPercent: 0.5,
};
const certificate = {
  testerId,
  number: 'C-2',
  laboratory: 'Quern Laboratory',
  accreditation: 'Q-0042',
  issuedOn: '2026-06-14',
  dueOn: '2027-06-14',
  traceability: 'To the SI',
  temperatureC: '21,5',
  unit: 'N.m' as const,
  points: 'cw\t10\t0,1\t0,3\t2\ncw\t500\t-0,1\t0,3\t2',
};

describe('testers', async () => {
  const store = await testStore();
  let world: Awaited<ReturnType<typeof makeWorld>>;
  const asLead = () => store.contextFor(actorOf(world.staff.lead));
  const tester = async () =>
    (await store.db.select().from(testers).where(eq(testers.id, testerId)))[0]!;
  beforeEach(async () => {
    await store.reset();
    world = await makeWorld(store.db);
  });

  it('takes a range as it is typed, in its unit', async () => {
    const { testerId: added } = await addTester(asLead(), call(1), {
      ...description,
      name: 'T-02',
      unit: 'lbf.ft',
      min: '7,5',
      max: '250',
      resolution: '0.1',
      temperatureCoefficientPercentPerK: '',
      connection: { kind: 'serial', path: '/dev/ttyUSB0', baudRate: '9600', unit: 'lbf.ft' },
    });
    const [row] = await store.db.select().from(testers).where(eq(testers.id, added));
    expect(row!.maxNm).toBeCloseTo(338.954, 3);
    expect(row!.temperatureCoefficientPercentPerK).toBeNull();
    expect(row!.connection).toMatchObject({ kind: 'serial', baudRate: 9600 });
    expect(row!.lockedReason).toBeNull();
  });

  it.each([
    ['a name that is taken', { name: 'T-01' }, 'name'],
    ['a range upside down', { min: 500, max: 10 }, 'max'],
    ['a torque that is no number', { max: 'wide' }, 'max'],
    ['a negative torque', { min: -1 }, 'min'],
    ['a resolution as coarse as the range', { resolution: 100 }, 'resolution'],
    ['a name of 10 kB', { maker: 'x'.repeat(10_000) }, 'maker'],
    [
      'a pattern without a value',
      {
        connection: {
          kind: 'serial',
          path: '/dev/x',
          baudRate: 9600,
          unit: 'N.m',
          linePattern: '.*',
        },
      },
      'connection.linePattern',
    ],
    [
      'an unknown baud rate',
      { connection: { kind: 'serial', path: '/dev/x', baudRate: 9601, unit: 'N.m' } },
      'connection.baudRate',
    ],
  ])('refuses %s', async (_what, change, field) => {
    const input: unknown = { ...description, name: 'T-02', ...change };
    const refusal = await addTester
      .fromWire(asLead(), call(1), input)
      .catch((error: unknown) => error);
    expect(refusal).toMatchObject({
      code: 'invalid',
      extra: { fields: { [field]: expect.any(String) } },
    });
  });

  it('stays locked for the check that ran when its proof failed', async () => {
    const checkId = await checkOnBench(asLead(), world.bench.id, world.tag.id);
    await addProof(asLead(), call(1), { ...proof, reading: 103 });
    await expect(addProof(asLead(), call(2), proof)).rejects.toMatchObject({ code: 'wrong-move' });
    await stopEarly(asLead(), call(3), { checkId, reason: 'The tester needs a look' });
    expect(await signOff(asLead(), call(4), { checkId })).toMatchObject({ verdict: 'not-judged' });
    expect(await addProof(asLead(), call(5), proof)).toMatchObject({ lockLifted: true });
  });

  it('keeps its numbers while a check runs on it, and lets its name and plate change', async () => {
    await checkOnBench(asLead(), world.bench.id, world.tag.id);
    for (const change of [{ max: 400 }, { resolution: 0.2 }, { correctionApplied: true }]) {
      await expect(
        changeTester(asLead(), call(1), { testerId, tester: { ...description, ...change } }),
      ).rejects.toMatchObject({
        code: 'wrong-move',
        message: expect.stringContaining('check is running'),
      });
    }
    await changeTester(asLead(), call(2), {
      testerId,
      tester: { ...description, serial: 'HX-0002' },
    });
    expect((await tester()).serial).toBe('HX-0002');
  });

  it('is locked with a reason, and its bench and connection are told', async () => {
    await lockTester(asLead(), call(1), { testerId, reason: ' Dropped. ' });
    expect((await tester()).lockedReason).toBe('Dropped.');
    expect(store.published.at(-1)!.events.map(({ kind }) => kind)).toEqual([
      'testers',
      'line',
      'bench',
    ]);
    await expect(lockTester(asLead(), call(2), { testerId, reason: ' ' })).rejects.toMatchObject({
      extra: { fields: { reason: 'The reason is missing.' } },
    });
  });

  it('is locked by a failed proof and freed by a passed one; both proofs stay', async () => {
    expect(await addProof(asLead(), call(1), { ...proof, reading: 100.6 })).toMatchObject({
      result: 'failed',
    });
    expect((await tester()).lockedReason).toBe(
      'Proof failed: +0.60 % at its load, the limit is ±0.5 %.',
    );
    expect(await addProof(asLead(), call(2), proof)).toMatchObject({
      result: 'passed',
      lockLifted: true,
    });
    expect((await tester()).lockedReason).toBeNull();
    expect(await store.db.select().from(testerProofs)).toHaveLength(3);
  });

  it('takes no verdict from whoever enters a proof', async () => {
    const input: unknown = { ...proof, reading: 101, result: 'passed' };
    expect(await addProof.fromWire(asLead(), call(1), input)).toMatchObject({ result: 'failed' });
  });

  it('asks once more when a reading is far from its load', async () => {
    const far = { ...proof, reading: 1002 };
    await expect(addProof(asLead(), call(1), far)).rejects.toMatchObject({
      code: 'confirm',
      extra: { question: 'far-off' },
    });
    expect((await tester()).lockedReason).toBeNull();
    await addProof(asLead(), call(2), { ...far, sure: true });
    expect((await tester()).lockedReason).toContain('+902.00 %');
  });

  it.each([5, 501])('refuses a load of %s N·m outside the range', async (load) => {
    await expect(
      addProof(asLead(), call(1), { ...proof, load, reading: load }),
    ).rejects.toMatchObject({
      code: 'invalid',
      extra: { fields: { load: expect.stringContaining('10 N·m to 500 N·m') } },
    });
  });

  it('keeps a certificate as it was pasted', async () => {
    const { certificateId } = await addCertificate(asLead(), call(1), {
      ...certificate,
      issuedOn: '2026-06-01',
    });
    const [row] = await store.db
      .select()
      .from(certificates)
      .where(eq(certificates.id, certificateId));
    expect(row).toMatchObject({ temperatureC: 21.5, dueOn: '2027-06-14' });
    expect(row!.points).toEqual([
      { direction: 'cw', torqueNm: 10, errorPercent: 0.1, expandedPercent: 0.3, k: 2 },
      { direction: 'cw', torqueNm: 500, errorPercent: -0.1, expandedPercent: 0.3, k: 2 },
    ]);
  });

  it('refuses points above the range, and says that the unit may be wrong', async () => {
    await expect(
      addCertificate(asLead(), call(1), { ...certificate, unit: 'lbf.ft', issuedOn: '2026-06-01' }),
    ).rejects.toMatchObject({
      extra: { fields: { points: expect.stringContaining('Is the unit right?') } },
    });
  });

  it('refuses a due date that is not after the date of issue, and a date in the future', async () => {
    await expect(
      addCertificate(asLead(), call(1), { ...certificate, dueOn: certificate.issuedOn }),
    ).rejects.toMatchObject({ extra: { fields: { dueOn: expect.any(String) } } });
    await expect(
      addCertificate(asLead(), call(2), { ...certificate, issuedOn: '2026-08-01' }),
    ).rejects.toMatchObject({ extra: { fields: { issuedOn: expect.stringContaining('future') } } });
  });

  it('is freed by a certificate that was issued since the lock, and by no older one', async () => {
    await lockTester(asLead(), call(1), { testerId, reason: 'Dropped.' });
    store.now = new Date(TEST_NOW.getTime() + 2 * DAY_MS);
    const older = await addCertificate(asLead(), call(2), {
      ...certificate,
      issuedOn: '2026-06-12',
    });
    expect(older.lockLifted).toBe(false);
    expect((await tester()).lockedReason).toBe('Dropped.');
    const newer = await addCertificate(asLead(), call(3), certificate);
    expect(newer.lockLifted).toBe(true);
    expect((await tester()).lockedReason).toBeNull();
  });

  it('has a name of its own', async () => {
    await makeTester(store.db, { id: fixedId('tester', 2), name: 'T-02' });
    await expect(
      changeTester(asLead(), call(1), { testerId, tester: { ...description, name: 'T-02' } }),
    ).rejects.toMatchObject({ extra: { fields: { name: expect.any(String) } } });
  });
});
