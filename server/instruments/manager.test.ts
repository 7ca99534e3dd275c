import { mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import type { TesterConnection } from '@/lib/signal/connection';
import { DEFAULT_LINE_PATTERN } from '@/lib/signal/pattern';
import { createManualTime } from '@/tests/support/manual-time';
import { createInstrumentManager, type InstrumentManagerOptions } from './manager';
import type { OpenedPort } from './open-port';
import { isSimulated } from './simulated';

const keyed: TesterConnection = { kind: 'keyed' };
const serialAt = (port: string, linePattern = DEFAULT_LINE_PATTERN): TesterConnection => ({
  kind: 'serial',
  path: port,
  baudRate: 9600,
  linePattern,
  unit: 'N.m',
});

function createRig(changes: Partial<InstrumentManagerOptions> = {}) {
  const time = createManualTime();
  const events: string[] = [];
  const errors: object[] = [];
  const ports = new Map<string, { opened: number; closed: number; send(text: string): void }>();
  const openPort = async (settings: { path: string }): Promise<OpenedPort> => {
    const port = ports.get(settings.path) ?? { opened: 0, closed: 0, send: () => {} };
    port.opened += 1;
    ports.set(settings.path, port);
    return {
      onData: (listener) => (port.send = (text) => listener(new TextEncoder().encode(text))),
      onClose: () => {},
      isPresent: async () => true,
      close: async () => void (port.closed += 1),
    };
  };
  const manager = createInstrumentManager({
    ...time,
    openPort,
    logger: { info: () => {}, error: (details) => errors.push(details) },
    onPull: (testerId, { valueNm }) => void events.push(`${testerId} pull ${valueNm}`),
    onStatus: (testerId, { state }) => void events.push(`${testerId} ${state}`),
    onProblem: (testerId, { code }) => void events.push(`${testerId} problem ${code}`),
    ...changes,
  });
  return { time, events, errors, ports, manager };
}

describe('instrument manager', () => {
  it('attaches what is new, leaves what is unchanged, detaches what is gone', async () => {
    const { manager, events, ports, time } = createRig();
    await manager.sync([
      { testerId: 'a', connection: serialAt('/dev/one') },
      { testerId: 'b', connection: keyed },
    ]);
    await time.advance(100);
    const a = manager.get('a');
    await manager.sync([
      { testerId: 'a', connection: { ...serialAt('/dev/one') } },
      { testerId: 'c', connection: keyed },
    ]);
    expect(manager.get('a')).toBe(a);
    expect(manager.get('b')).toBeNull();
    expect(manager.status('b')).toBeNull();
    expect(manager.status('c')?.state).toBe('ready');
    expect(ports.get('/dev/one')).toMatchObject({ opened: 1, closed: 0 });
    expect(events).toEqual(['a connecting', 'b ready', 'a ready', 'b detached', 'c ready']);
  });

  it('attaches a changed tester anew, its old port free before the new one is tried', async () => {
    const { manager, ports, time } = createRig();
    await manager.sync([{ testerId: 'a', connection: serialAt('/dev/one') }]);
    await time.advance(100);
    await manager.sync([{ testerId: 'a', connection: serialAt('/dev/two') }]);
    await time.advance(100);
    expect(ports.get('/dev/one')?.closed).toBe(1);
    expect(ports.get('/dev/two')?.opened).toBe(1);
    expect(manager.status('a')?.state).toBe('ready');
  });

  it('never lets one tester feed another', async () => {
    const { manager, events, ports, time } = createRig();
    await manager.sync([
      { testerId: 'a', connection: serialAt('/dev/one') },
      { testerId: 'b', connection: serialAt('/dev/two') },
    ]);
    await time.advance(100);
    ports.get('/dev/two')?.send('2\n');
    ports.get('/dev/one')?.send('1\n?\n');
    expect(events.slice(-3)).toEqual(['b pull 2', 'a pull 1', 'a problem unreadable-line']);
  });

  it('refuses a second tester on one port until the first has left it', async () => {
    const { manager, ports } = createRig();
    const first = { testerId: 'a', connection: serialAt('/dev/one') };
    const second = { testerId: 'b', connection: serialAt('/dev/one') };
    await manager.sync([first, second]);
    expect(manager.get('b')).toBeNull();
    expect(manager.status('b')).toMatchObject({
      state: 'lost',
      message: '/dev/one is already used by another tester.',
    });
    // Whoever has it keeps it, whatever the order of the list.
    await manager.sync([second, first]);
    expect(manager.get('a')).not.toBeNull();
    expect(ports.get('/dev/one')?.opened).toBe(1);
    await manager.sync([second]);
    expect(manager.status('b')?.state).toBe('connecting');
  });

  it('knows one device under two names', async () => {
    const folder = mkdtempSync(path.join(tmpdir(), 'pullpost-claims-'));
    try {
      const device = path.join(folder, 'device');
      writeFileSync(device, '');
      symlinkSync(device, path.join(folder, 'by-id'));
      const { manager } = createRig();
      await manager.sync([
        { testerId: 'a', connection: serialAt(device) },
        { testerId: 'b', connection: serialAt(path.join(folder, 'by-id')) },
      ]);
      expect(manager.status('b')?.message).toContain('already used');
    } finally {
      rmSync(folder, { recursive: true });
    }
  });

  it('shows why a tester cannot be used, and attaches the others', async () => {
    const { manager, events } = createRig();
    await manager.sync([
      { testerId: 'a', connection: serialAt('/dev/one', '(\\d+)+') },
      { testerId: 'b', connection: keyed },
    ]);
    expect(manager.status('a')).toMatchObject({
      state: 'lost',
      message: 'The line pattern needs a group named value: (?<value>…).',
    });
    expect(events).toEqual(['a lost', 'b ready']);
  });

  it.each([
    [
      'throws',
      () => {
        throw new Error('no room');
      },
    ],
    [
      'rejects',
      async () => {
        throw new Error('no room');
      },
    ],
  ])('logs the pull when its listener %s, and goes on', async (_how, onPull) => {
    const { manager, errors, ports, time } = createRig({ onPull });
    await manager.sync([{ testerId: 'a', connection: serialAt('/dev/one') }]);
    await time.advance(100);
    ports.get('/dev/one')?.send('1\n2\n');
    await time.advance(0);
    expect(errors).toMatchObject([
      { testerId: 'a', pull: { valueNm: 1 } },
      { testerId: 'a', pull: { valueNm: 2 } },
    ]);
  });

  it('hands out the simulated tester with its own controls', async () => {
    const { manager, events, time } = createRig({ autoplay: true });
    const connection = {
      kind: 'simulated',
      biasPercent: 0,
      scatterPercent: 0,
      seed: 1,
      secondsPerPull: 1,
    } as const;
    await manager.sync([{ testerId: 'a', connection }]);
    const tester = manager.get('a');
    if (!tester || !isSimulated(tester)) throw new Error('not the simulated tester');
    tester.expect({ targetNm: 20, direction: 'cw' });
    await time.advance(1000);
    expect(events).toEqual(['a ready', 'a pull 20']);
  });

  it('refuses a list with a tester twice, and any list once closed', async () => {
    const { manager, events } = createRig();
    const tester = { testerId: 'a', connection: keyed };
    await expect(manager.sync([tester, tester])).rejects.toThrow(RangeError);
    await manager.sync([tester]);
    await manager.close();
    expect(events).toEqual(['a ready', 'a detached']);
    await expect(manager.sync([tester])).rejects.toThrow('closed');
  });

  it('does overlapping calls one after the other', async () => {
    const { manager, ports } = createRig();
    await Promise.all([
      manager.sync([{ testerId: 'a', connection: serialAt('/dev/one') }]),
      manager.sync([]),
      manager.sync([{ testerId: 'b', connection: serialAt('/dev/one') }]),
    ]);
    expect(manager.status('a')).toBeNull();
    expect(manager.status('b')?.state).toBe('connecting');
    expect(ports.get('/dev/one')).toMatchObject({ opened: 2, closed: 1 });
  });
});
