import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { beforeEach, describe, expect, it } from 'vitest';
import { checks, meets, pullDecisions, pulls, records, tags, testerProofs } from '@/db/schema';
import { parseRecord } from '@/lib/record/record';
import { acceptPull } from '@/server/commands/pull/accept';
import { recordPull } from '@/server/commands/pull/record';
import { voidPull } from '@/server/commands/pull/void';
import { callTag } from '@/server/commands/tag/call';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';
import { checkSnapshot } from '@/server/queries/check/snapshot';
import { ticketSnapshot } from '@/server/queries/ticket/snapshot';
import { actorOf, makeWorld } from '@/tests/support/factories';
import { checkOnBench, codeOf, PLATE, startInput } from '@/tests/support/line';
import { TEST_SECRET, testStore, type TestStore } from '@/tests/support/store';
import { abandonCheck } from './abandon';
import { addNote } from './note';
import { pauseCheck, resumeCheck } from './pause';
import { signOff } from './sign-off';
import { startCheck } from './start';
import { stopEarly } from './stop-early';

let store: TestStore;
let world: Awaited<ReturnType<typeof makeWorld>>;

beforeEach(async () => {
  store = await testStore();
  await store.reset();
  world = await makeWorld(store.db);
});

const operator = () => store.contextFor(actorOf(world.staff.operator));
const lead = () => store.contextFor(actorOf(world.staff.lead));
const start = (change = {}) => checkOnBench(operator(), world.bench.id, world.tag.id, change);
const view = async () => (await checkSnapshot(store.db, world.bench.id, store.now)).check!;

const pull = (checkId: string, value: number | null, more = {}) =>
  recordPull(operator(), uuidv7(), { checkId, value, unit: 'N.m', ...more });
const exercise = async (checkId: string) => {
  while ((await view()).step?.kind === 'exercise') await pull(checkId, null);
};
/** Every remaining pull, each reading at this share of its target. */
const pullAll = async (checkId: string, share: number) => {
  for (let step = (await view()).step; step; step = (await view()).step) {
    await pull(checkId, step.kind === 'exercise' ? null : step.target * share);
  }
};
const recordOf = async (checkId: string) =>
  parseRecord(
    (await store.db.select().from(records).where(eq(records.checkId, checkId)))[0]!.canonical,
  );

describe('starting', () => {
  it('fixes the plan of the plate, and keeps what the tester rests on', async () => {
    const checkId = await start();
    const [check] = await store.db.select().from(checks);
    expect(check).toMatchObject({
      id: checkId,
      certificateId: world.certificate.id,
      proofId: world.proof.id,
    });
    // ISO 6789-1: 20, 60 and 100 % of the maximum; five exercise pulls; five readings a point.
    expect(check!.plan.points.map(({ target }) => target)).toEqual([68, 204, 340]);
    expect(check!.plan.steps).toHaveLength(20);
    expect((await view()).step).toMatchObject({
      kind: 'exercise',
      targetLabel: '340',
      pullWords: 'Pull 1 of 5',
    });
  });

  it.each([
    [
      'a tool beyond the tester',
      { tool: { ...PLATE, rangeMax: 800, claim: null } },
      'above the tester',
    ],
    ['the tester’s other mode', { asFound: { testerMode: 'live' } }, 'other mode'],
    ['an owner who was not asked', { ownerConfirmed: false }, 'whose tool'],
    ['cautions that were not read', { cautionsSeen: false }, 'cautions'],
  ])('refuses %s', async (_, change, words) => {
    await expect(start(change as object)).rejects.toThrow(words);
  });

  it('holds the visitor’s consent: working points only', async () => {
    await store.db.update(tags).set({ consent: 'working' });
    await expect(start()).rejects.toThrow('working points only');
    const input = startInput(world.bench.id, world.tag.id, {
      scheme: 'working',
      workingPoints: [90, 120],
    });
    await startCheck(operator(), uuidv7(), input);
    expect((await view()).points.map(({ label }) => label)).toEqual(['90', '120']);
    // `working` exercises at the highest chosen point, never at the maximum.
    expect((await view()).step).toMatchObject({ kind: 'exercise', targetLabel: '120' });
  });

  it('needs the tool on the bench, once', async () => {
    const input = startInput(world.bench.id, world.tag.id);
    expect(await codeOf(startCheck(operator(), uuidv7(), input))).toBe('wrong-move');
    await callTag(operator(), uuidv7(), { benchId: world.bench.id });
    await takeOnBench(operator(), uuidv7(), { benchId: world.bench.id, tagId: world.tag.id });
    await startCheck(operator(), uuidv7(), input);
    expect(await codeOf(startCheck(operator(), uuidv7(), input))).toBe('conflict');
  });

  it('says before the first pull when the tester was not proved today', async () => {
    await store.db.execute(`truncate ${'tester_proofs'} cascade`);
    await start();
    expect((await view()).barred).toEqual(['the tester was not proved today']);
    expect((await view()).verdict).toBe('not-judged');
    expect(await store.db.select().from(testerProofs)).toEqual([]);
  });
});

describe('pulling', () => {
  it('leads through exercise pulls and then each set point from below', async () => {
    const checkId = await start();
    await exercise(checkId);
    expect((await view()).step).toMatchObject({
      kind: 'reading',
      targetLabel: '68',
      heading: 'Set point 1 of 3, clockwise',
    });
    await pull(checkId, 67.1);
    const after = await view();
    expect(after.step).toMatchObject({ targetLabel: '68', pullWords: 'Pull 2 of 5' });
    // ISO 6789-1: 100·(68 − 67.1)/67.1 = 1.341 %
    expect(after.pulls.at(-1)).toMatchObject({ state: 'accepted', words: 'delivers 1.3 % low' });
    expect(after.points[0]!.readings[0]!.deviation).toBeCloseTo(1.3413, 4);
  });

  it.each([
    ['no number', Number.NaN, 'must be a number'],
    ['a negative torque', -4, 'not negative'],
    ['nothing', null, 'Type what the tester shows'],
    ['zero', 0, 'above zero'],
    ['more than the tester can measure', 501, 'above the tester’s range'],
  ])('refuses %s, and takes nothing', async (_, value, words) => {
    const checkId = await start();
    await exercise(checkId);
    await expect(pull(checkId, value)).rejects.toThrow(words);
    expect((await view()).points[0]!.readings).toEqual([]);
  });

  it('asks about a value that looks mistyped, and takes it when it is confirmed', async () => {
    const checkId = await start();
    await exercise(checkId);
    // 68 N·m is 50.2 lbf·ft (NIST SP 811).
    await expect(pull(checkId, 50.2)).rejects.toMatchObject({
      code: 'confirm',
      extra: { question: 'wrong-scale' },
    });
    await expect(pull(checkId, 340)).rejects.toMatchObject({
      code: 'confirm',
      extra: { question: 'far' },
    });
    await pull(checkId, 50.2, { confirmed: true });
    expect((await view()).points[0]!.readings).toHaveLength(1);
  });

  it('never asks because a value is outside tolerance', async () => {
    const checkId = await start();
    await exercise(checkId);
    await pull(checkId, 68 * 0.88);
    expect((await view()).points[0]!.readings[0]!.beyond).toBe(true);
  });

  it('of an indicating tool needs both its display and the tester', async () => {
    const checkId = await start({
      tool: { ...PLATE, toolClass: 'I-C', division: 0.1, claim: null },
      asFound: { testerMode: 'live', temperatureC: 21 },
    });
    await exercise(checkId);
    await expect(pull(checkId, 67.4)).rejects.toMatchObject({
      extra: { fields: { toolValue: expect.any(String) } },
    });
    await pull(checkId, 67.4, { toolValue: 68.2 });
    // 100·(68.2 − 67.4)/67.4
    expect((await view()).points[0]!.readings[0]!.deviation).toBeCloseTo(1.18694, 5);
  });

  it('refuses what no deviation can be made of, and the check goes on', async () => {
    await store.db
      .update(meets)
      .set({ planSettings: { ...world.meet.planSettings, basis: 'set' } });
    const checkId = await start({
      tool: { ...PLATE, toolClass: 'I-C', division: 0.1, claim: null },
      asFound: { testerMode: 'live', temperatureC: 21 },
    });
    await exercise(checkId);
    await expect(pull(checkId, 67.4, { toolValue: 0 })).rejects.toMatchObject({
      extra: { fields: { toolValue: expect.stringContaining('shows nothing') } },
    });
    await expect(pull(checkId, 67.4, { toolValue: 1e300 })).rejects.toThrow('No tool');
    await expect(pull(checkId, 1e-300, { confirmed: true, toolValue: 68 })).rejects.toThrow(
      'above zero',
    );
    await pull(checkId, 67.4, { toolValue: 68.2 });
    // Set basis: 100·(67.4 − 68.2)/68.2
    expect((await view()).points[0]!.readings[0]!.deviation).toBeCloseTo(-1.17302, 5);
  });

  it('comes up from below again for a pull that is repeated at an earlier set point', async () => {
    const checkId = await start();
    await exercise(checkId);
    const first = await pull(checkId, 67);
    expect((await view()).step?.instruction).toContain('Leave it at 68');
    for (let index = 1; index < 6; index += 1) {
      const { target } = (await view()).step!;
      await pull(checkId, target);
    }
    expect((await view()).step?.instruction).toContain('Leave it at 204');
    await voidPull(operator(), uuidv7(), { pullId: first.pullId, fault: 'slipped' });
    expect((await view()).step?.instruction).toContain('Set 68 N·m, coming up from below');
    await pull(checkId, 67);
    expect((await view()).step?.instruction).toContain('Set 204 N·m, coming up from below');
    const { pullId } = await pull(checkId, 203);
    await voidPull(operator(), uuidv7(), { pullId, fault: 'set-wrongly' });
    expect((await view()).step?.instruction).toContain('Set 204 N·m, coming up from below');
  });

  it('takes a typed value for the step that it was typed for, or not at all', async () => {
    const checkId = await start();
    await exercise(checkId);
    const { index } = (await view()).step!;
    const tester = store.contextFor({ kind: 'tester', testerId: world.tester.id });
    await recordPull(tester, uuidv7(), { checkId, value: 67.2, unit: 'N.m' });
    const late = pull(checkId, 67.2, { stepIndex: index });
    expect(await codeOf(late)).toBe('conflict');
    expect((await view()).pulls.filter(({ kind }) => kind === 'reading')).toHaveLength(1);
    await pull(checkId, 67.1, { stepIndex: index + 1 });
  });

  it('never sets a preset tool', async () => {
    await start({
      tool: { ...PLATE, toolClass: 'II-B', nominal: 100, division: null, claim: null },
    });
    expect((await view()).step?.instruction).toBe(
      'Leave it as it is set. Pull smoothly until it lets go.',
    );
  });

  it('takes nothing while paused', async () => {
    const checkId = await start();
    await pauseCheck(operator(), uuidv7(), { checkId });
    await expect(pull(checkId, null)).rejects.toThrow('paused');
    await resumeCheck(operator(), uuidv7(), { checkId });
    await pull(checkId, null);
  });

  it('keeps what a tester offers until the operator decides, and from no other tester', async () => {
    const checkId = await start();
    const tester = store.contextFor({ kind: 'tester', testerId: world.tester.id });
    const offer = (value: number, more = {}) =>
      recordPull(tester, uuidv7(), { checkId, value, unit: 'N.m', ...more });
    for (let index = 0; index < 5; index += 1) await offer(339);
    expect((await view()).step).toMatchObject({ kind: 'reading' });
    await offer(67.2, { direction: 'cw' });
    const offered = (await view()).offered!;
    expect(offered).toMatchObject({ state: 'offered', reference: '67.2 N·m' });
    expect((await view()).points[0]!.readings).toEqual([]);
    await expect(signOff(operator(), uuidv7(), { checkId })).rejects.toThrow('still waits');
    await acceptPull(operator(), uuidv7(), { pullId: offered.id });
    expect((await view()).points[0]!.readings).toHaveLength(1);
    expect(await codeOf(acceptPull(operator(), uuidv7(), { pullId: offered.id }))).toBe('conflict');
    await expect(offer(67.2, { direction: 'ccw' })).rejects.toThrow('other way');
    const stranger = store.contextFor({ kind: 'tester', testerId: uuidv7() });
    expect(await codeOf(recordPull(stranger, uuidv7(), { checkId, value: 67, unit: 'N.m' }))).toBe(
      'forbidden',
    );
  });
});

describe('voiding', () => {
  it('is for a listed fault, keeps the pull, and asks for it again', async () => {
    const checkId = await start();
    await exercise(checkId);
    const { pullId } = await pull(checkId, 61);
    const wrong = voidPull(operator(), uuidv7(), { pullId, fault: 'too-low' as never });
    expect(await codeOf(wrong)).toBe('invalid');
    await voidPull(operator(), uuidv7(), { pullId, fault: 'slipped', note: 'Socket was loose' });
    const after = await view();
    expect(after.pulls.at(-1)).toMatchObject({
      state: 'voided',
      faultWords: 'The drive slipped',
      note: 'Socket was loose',
    });
    expect(after.step).toMatchObject({ pullWords: 'Pull 1 of 5' });
    expect(await codeOf(voidPull(operator(), uuidv7(), { pullId, fault: 'slipped' }))).toBe(
      'conflict',
    );
  });

  it('of more than two at a point needs a lead', async () => {
    const checkId = await start();
    await exercise(checkId);
    for (let index = 0; index < 2; index += 1) {
      const { pullId } = await pull(checkId, 61);
      await voidPull(operator(), uuidv7(), { pullId, fault: 'knocked' });
    }
    const { pullId } = await pull(checkId, 61);
    expect(await codeOf(voidPull(operator(), uuidv7(), { pullId, fault: 'knocked' }))).toBe(
      'forbidden',
    );
    await voidPull(lead(), uuidv7(), { pullId, fault: 'knocked' });
    expect(await store.db.select().from(pulls)).toHaveLength(8);
  });

  it('and accepting are append-only', async () => {
    const checkId = await start();
    await pull(checkId, null);
    await expect(store.db.update(pulls).set({ rawNm: 1 })).rejects.toThrow();
    await expect(store.db.delete(pullDecisions)).rejects.toThrow();
  });
});

describe('signing off', () => {
  it('names what is missing', async () => {
    const checkId = await start();
    await exercise(checkId);
    await pull(checkId, 67);
    await expect(signOff(operator(), uuidv7(), { checkId })).rejects.toThrow(
      'reading 2 of 5 at 68 N·m clockwise',
    );
    expect(await store.db.select().from(records)).toEqual([]);
  });

  it('writes one self-contained record, numbered post-year-sequence, and the ticket shows it', async () => {
    const checkId = await start();
    await addNote(operator(), uuidv7(), { checkId, text: '<b>Handle</b> is worn' });
    await pullAll(checkId, 0.985);
    expect(await signOff(operator(), uuidv7(), { checkId })).toMatchObject({
      number: 'TP-2026-0001',
      verdict: 'within',
    });
    const record = await recordOf(checkId);
    expect(record).toMatchObject({
      number: 'TP-2026-0001',
      tagCode: 'A01',
      certificate: { number: world.certificate.number },
      proof: { result: 'passed' },
      notes: [{ text: '<b>Handle</b> is worn' }],
      evaluation: { verdict: 'within', statement: 'Within tolerance' },
    });
    expect(record.pulls).toHaveLength(20);
    expect(JSON.stringify(record)).not.toContain(world.staff.operator.name);
    const ticket = await ticketSnapshot(store.db, world.tag.id, store.now, TEST_SECRET);
    expect(ticket).toMatchObject({ state: 'ready', result: { verdict: 'within' } });
    expect(await codeOf(pull(checkId, 67))).toBe('wrong-move');
  });

  it('gives the next number to the next record, also in a second check of one tag', async () => {
    const first = await start();
    await pullAll(first, 1);
    await signOff(operator(), uuidv7(), { checkId: first });
    await takeOnBench(operator(), uuidv7(), { benchId: world.bench.id, tagId: world.tag.id });
    const input = startInput(world.bench.id, world.tag.id, { scheme: 'short' });
    const { checkId } = await startCheck(operator(), uuidv7(), input);
    await pullAll(checkId, 1);
    expect(await signOff(operator(), uuidv7(), { checkId })).toMatchObject({
      number: 'TP-2026-0002',
    });
    expect((await recordOf(checkId)).evaluation.statement).toBe(
      'Within at 68, 204 and 340 N·m (short check)',
    );
  });

  it('of a check stopped early says so, and does not judge what was not read', async () => {
    const checkId = await start();
    await exercise(checkId);
    for (let index = 0; index < 5; index += 1) await pull(checkId, 68);
    await stopEarly(operator(), uuidv7(), { checkId, reason: 'Owner has to leave' });
    await expect(pull(checkId, 204)).rejects.toThrow('ended early');
    expect(await signOff(operator(), uuidv7(), { checkId })).toMatchObject({
      verdict: 'not-judged',
    });
    const record = await recordOf(checkId);
    expect(record.stoppedEarly).toBe(true);
    expect(record.notFollowed.join(' ')).toContain(
      'Stopped early, 10 pulls not made: Owner has to leave.',
    );
  });

  it('a tool that did not let go is outside, with that torque', async () => {
    const checkId = await start();
    await exercise(checkId);
    await expect(pull(checkId, 66, { outcome: 'no-release' })).rejects.toThrow('Pull on past 68');
    await pull(checkId, 88, { outcome: 'no-release' });
    await pullAll(checkId, 1);
    expect(await signOff(operator(), uuidv7(), { checkId })).toMatchObject({ verdict: 'outside' });
    expect((await recordOf(checkId)).evaluation.points[0]).toMatchObject({
      verdict: 'outside',
      noReleaseNm: 88,
    });
  });

  it('a value that the tester sent can be taken as how far it was pulled without letting go', async () => {
    const checkId = await start();
    const tester = store.contextFor({ kind: 'tester', testerId: world.tester.id });
    const offer = (value: number) => recordPull(tester, uuidv7(), { checkId, value, unit: 'N.m' });
    for (let index = 0; index < 5; index += 1) await offer(339);
    const { pullId } = await offer(88);
    const take = (outcome: 'no-release') => acceptPull(operator(), uuidv7(), { pullId, outcome });
    await take('no-release');
    expect((await view()).points[0]).toMatchObject({ verdict: 'outside' });
    expect((await view()).step).toMatchObject({ targetLabel: '204' });
  });

  it('without today’s proof is not judged, whatever the readings', async () => {
    await store.db.execute('truncate tester_proofs cascade');
    const checkId = await start();
    await pullAll(checkId, 1);
    expect(await signOff(operator(), uuidv7(), { checkId })).toMatchObject({
      verdict: 'not-judged',
    });
    expect((await recordOf(checkId)).evaluation.statement).toContain(
      'the tester was not proved today',
    );
  });
});

describe('abandoning', () => {
  it('gives the tool back, keeps the place in the line, and leaves no record', async () => {
    const checkId = await start();
    await exercise(checkId);
    await abandonCheck(operator(), uuidv7(), {
      tagId: world.tag.id,
      reason: 'Head is loose',
      to: 'visitor',
    });
    const [tag] = await store.db.select().from(tags);
    expect(tag).toMatchObject({ state: 'waiting', place: 'visitor', benchId: null, position: 1 });
    const [check] = await store.db.select().from(checks).where(eq(checks.id, checkId));
    expect(check).toMatchObject({ state: 'abandoned', abandonReason: 'Head is loose' });
    expect(await store.db.select().from(pulls)).toHaveLength(5);
  });
});
