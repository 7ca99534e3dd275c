import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { DEFAULT_LINE_PATTERN } from '@/lib/signal/pattern';
import { laySerialCable, type SerialCable } from '@/tests/support/socat';
import { realSchedule, type InstrumentStatus } from './instrument';
import { createInstrumentManager, type InstrumentManager } from './manager';
import { openPort } from './open-port';

const within = (timeout: number) => ({ timeout, interval: 10 });

describe('serial testers over pseudo-terminals', () => {
  let cable: SerialCable;
  let manager: InstrumentManager;
  let pulls: string[];
  let problems: string[];
  let statuses: string[];

  const serialAt = (path: string) =>
    ({
      kind: 'serial',
      path,
      baudRate: 9600,
      linePattern: DEFAULT_LINE_PATTERN,
      unit: 'N.m',
    }) as const;
  const isReady = (testerId: string) =>
    vi.waitFor(() => expect(manager.status(testerId)?.state).toBe('ready'), within(10_000));

  beforeEach(async () => {
    pulls = [];
    problems = [];
    statuses = [];
    cable = await laySerialCable();
    manager = createInstrumentManager({
      now: () => new Date(),
      schedule: realSchedule,
      logger: { info: () => {}, error: (details) => problems.push(JSON.stringify(details)) },
      onPull: (testerId, { valueNm, direction }) =>
        void pulls.push(`${testerId} ${direction} ${valueNm.toFixed(3)}`),
      onStatus: (testerId, { state }: InstrumentStatus) =>
        void statuses.push(`${testerId} ${state}`),
      onProblem: (testerId, { code, raw }) => void problems.push(`${testerId} ${code} ${raw}`),
    });
  });

  afterEach(async () => {
    await manager.close();
    await cable.remove();
  });

  it('reads sign, unit and decimal comma, in whatever pieces they come', async () => {
    await manager.sync([{ testerId: 'a', connection: serialAt(cable.postEnd) }]);
    await isReady('a');
    await cable.send('  +12.34 N.m\r\n');
    await cable.send('-3.');
    await cable.send('2\n12,5 lbf.ft\r');
    await cable.send(Uint8Array.from([0x37, 0x20, 0x4e, 0xb7, 0x6d, 0x0d, 0x0a]));
    await vi.waitFor(
      () => expect(pulls).toEqual(['a cw 12.340', 'a ccw 3.200', 'a null 16.948', 'a null 7.000']),
      within(5000),
    );
    expect(problems).toEqual([]);
  });

  it('tells garbage and goes on', async () => {
    await manager.sync([{ testerId: 'a', connection: serialAt(cable.postEnd) }]);
    await isReady('a');
    await cable.send(`LOW BATT\r\n5 stone\r\n${'x'.repeat(300)}\r\n6.5\r\n`);
    await vi.waitFor(() => expect(pulls).toEqual(['a null 6.500']), within(5000));
    expect(problems).toEqual([
      'a unreadable-line LOW BATT',
      'a unreadable-line 5 stone',
      `a line-too-long ${'x'.repeat(201)}`,
    ]);
  });

  it('shows a pulled cable at once, loses nothing, and picks up when it is back', async () => {
    await manager.sync([{ testerId: 'a', connection: serialAt(cable.postEnd) }]);
    await isReady('a');
    await cable.send('10.0 N.m\r\n11.');
    await vi.waitFor(() => expect(pulls).toHaveLength(1), within(5000));
    await cable.pullOut();
    await vi.waitFor(() => expect(manager.status('a')?.state).toBe('lost'), within(1000));
    expect(manager.status('a')?.message).toContain('the cable is out or the tester is off');
    expect(problems).toEqual(['a half-line 11.']);
    await vi.waitFor(
      () => expect(manager.status('a')?.message).toContain('Is the cable in'),
      within(5000),
    );

    await cable.plugIn();
    await isReady('a');
    await cable.send('+12.0 N.m\r\n');
    await vi.waitFor(() => expect(pulls).toEqual(['a null 10.000', 'a cw 12.000']), within(5000));
    expect(problems).toHaveLength(1);
    expect(statuses).toEqual(['a connecting', 'a ready', 'a lost', 'a lost', 'a ready']);
  });

  it('shows it as well when the cable goes in the middle of a flow of lines', async () => {
    await manager.sync([{ testerId: 'a', connection: serialAt(cable.postEnd) }]);
    for (let round = 0; round < 4; round += 1) {
      await isReady('a');
      const flow = Array.from({ length: 20 }, () => cable.send('5\n').catch(() => {}));
      await cable.pullOut();
      await vi.waitFor(() => expect(manager.status('a')?.state).toBe('lost'), within(1000));
      await Promise.all(flow);
      await cable.plugIn();
    }
    expect(pulls.every((pull) => pull === 'a null 5.000')).toBe(true);
  });

  it('keeps two testers apart', async () => {
    const other = await laySerialCable();
    try {
      await manager.sync([
        { testerId: 'a', connection: serialAt(cable.postEnd) },
        { testerId: 'b', connection: serialAt(other.postEnd) },
      ]);
      await Promise.all([isReady('a'), isReady('b')]);
      for (let pull = 1; pull <= 10; pull += 1) {
        await Promise.all([cable.send(`${pull}\n`), other.send(`${pull + 100}\n`)]);
      }
      await vi.waitFor(() => expect(pulls).toHaveLength(20), within(5000));
      const valuesOf = (testerId: string) =>
        pulls.filter((pull) => pull.startsWith(testerId)).map((pull) => parseFloat(pull.slice(6)));
      expect(valuesOf('a')).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 10]);
      expect(valuesOf('b')).toEqual([101, 102, 103, 104, 105, 106, 107, 108, 109, 110]);

      await other.pullOut();
      await vi.waitFor(() => expect(manager.status('b')?.state).toBe('lost'), within(1000));
      expect(manager.status('a')?.state).toBe('ready');
    } finally {
      await other.remove();
    }
  });

  it('holds its port alone, and frees it when the tester is taken away', async () => {
    await manager.sync([{ testerId: 'a', connection: serialAt(cable.postEnd) }]);
    await isReady('a');
    const settings = { path: cable.postEnd, baudRate: 9600 };
    await expect(openPort(settings)).rejects.toThrow('is in use by another program');
    await manager.sync([]);
    const port = await openPort(settings);
    await port.close();
  });

  it('picks up when another program lets go of the port', async () => {
    const port = await openPort({ path: cable.postEnd, baudRate: 9600 });
    await manager.sync([{ testerId: 'a', connection: serialAt(cable.postEnd) }]);
    await vi.waitFor(
      () => expect(manager.status('a')?.message).toContain('in use by another program'),
      within(5000),
    );
    await port.close();
    await isReady('a');
  });

  it('says in plain words why a port cannot be opened', async () => {
    const opening = (path: string) => openPort({ path, baudRate: 9600 });
    await expect(opening('/dev/no-such-tester')).rejects.toThrow('There is no tester at');
    await expect(opening('/etc/hostname')).rejects.toThrow('is not a serial port');
    await expect(opening('/tmp')).rejects.toThrow('is not a serial port');
  });
});
