import { describe, expect, it } from 'vitest';
import { DEFAULT_LINE_PATTERN } from '@/lib/signal/pattern';
import { createManualTime } from '@/tests/support/manual-time';
import type { OpenedPort } from './open-port';
import { createSerialInstrument } from './serial';

const connection = {
  kind: 'serial',
  path: '/dev/ttyTEST',
  baudRate: 9600,
  linePattern: DEFAULT_LINE_PATTERN,
  unit: 'N.m',
} as const;

/** A port whose opening, bytes and loss are told from the test. */
function createRig() {
  const time = createManualTime();
  const rig = {
    time,
    fault: null as string | null,
    opened: 0,
    openNow: 0,
    present: true,
    send: (_text: string) => {},
    lose: () => {},
  };
  const openPort = async (): Promise<OpenedPort> => {
    if (rig.fault) throw new Error(rig.fault);
    rig.opened += 1;
    rig.openNow += 1;
    let open = true;
    return {
      onData: (listener) => (rig.send = (text) => listener(new TextEncoder().encode(text))),
      onClose: (listener) => (rig.lose = () => listener('gone')),
      isPresent: async () => rig.present,
      close: async () => {
        if (open) rig.openNow -= 1;
        open = false;
      },
    };
  };
  const tester = createSerialInstrument(connection, { ...time, openPort });
  const pulls: number[] = [];
  const problems: string[] = [];
  const statuses: string[] = [];
  tester.on('pull', ({ valueNm }) => pulls.push(valueNm));
  tester.on('problem', ({ code, message }) => problems.push(`${code}: ${message}`));
  tester.on('status', ({ state, message }) => statuses.push(`${state}: ${message}`));
  return Object.assign(rig, { tester, pulls, problems, statuses });
}

async function readyRig() {
  const rig = createRig();
  await rig.tester.attach();
  await rig.time.advance(100);
  expect(rig.tester.status().state).toBe('ready');
  return rig;
}

describe('serial instrument', () => {
  it('tries again after 0.5 s, then ever longer, at most 5 s apart, and begins anew after success', async () => {
    const rig = createRig();
    rig.fault = 'There is no tester at /dev/ttyTEST.';
    await rig.tester.attach();
    await rig.time.advance(0);
    for (const delayMs of [500, 1000, 2000, 4000, 5000, 5000]) {
      expect(rig.time.pending()).toEqual([delayMs]);
      await rig.time.advance(delayMs);
    }
    // One word about it, not one for each try.
    expect(rig.statuses).toEqual([
      'connecting: Opening /dev/ttyTEST.',
      'lost: There is no tester at /dev/ttyTEST. Trying again.',
    ]);
    rig.fault = null;
    await rig.time.advance(5100);
    expect(rig.tester.status().state).toBe('ready');
    rig.fault = 'There is no tester at /dev/ttyTEST.';
    rig.lose();
    expect(rig.tester.status().state).toBe('lost');
    expect(rig.time.pending()).toContain(500);
  });

  it('does not believe what comes while the port opens: it may be the end of a line', async () => {
    const rig = createRig();
    await rig.tester.attach();
    await rig.time.advance(50);
    rig.send('2.5 N.m\r\n3');
    await rig.time.advance(99);
    expect(rig.tester.status().state).toBe('connecting');
    await rig.time.advance(1);
    expect(rig.tester.status().state).toBe('ready');
    rig.send('112.5 N.m\r\n');
    expect(rig.pulls).toEqual([112.5]);
    expect(rig.problems).toEqual([
      'sent-while-opening: “2.5 N.m 3” came while the port was opening. Repeat that pull.',
    ]);
  });

  it('lets a tester that never pauses in after a second, from the next whole line on', async () => {
    const rig = createRig();
    await rig.tester.attach();
    for (let waitedMs = 0; waitedMs < 1000; waitedMs += 50) {
      await rig.time.advance(50);
      rig.send('1.0\n2.');
    }
    expect(rig.tester.status().state).toBe('ready');
    rig.send('5\n7.5\n');
    expect(rig.pulls.at(-1)).toBe(7.5);
    expect(rig.pulls).not.toContain(5);
  });

  it('drops half a line when the cable goes, names it, and never joins it to the next', async () => {
    const rig = await readyRig();
    rig.send('12.5\r\n1');
    rig.lose();
    expect(rig.problems).toEqual([
      'half-line: “1” was cut off by the lost connection. Repeat that pull.',
    ]);
    await rig.time.advance(600);
    rig.send('45.5\r\n');
    expect(rig.pulls).toEqual([12.5, 45.5]);
    expect(rig.openNow).toBe(1);
  });

  it('notices within a quarter of a second a device that went without the system saying so', async () => {
    const rig = await readyRig();
    rig.present = false;
    await rig.time.advance(250);
    expect(rig.tester.status().state).toBe('lost');
    expect(rig.openNow).toBe(0);
  });

  it('tells the first bad lines, then how many more there were', async () => {
    const rig = await readyRig();
    for (let line = 0; line < 205; line += 1) rig.send(`#${line}\n`);
    rig.send('20.25\n');
    expect(rig.pulls).toEqual([20.25]);
    expect(rig.problems).toHaveLength(5);
    expect(rig.problems[0]).toBe(
      'unreadable-line: “#0” was not taken: it does not look like a reading.',
    );
    await rig.time.advance(10_000);
    expect(rig.problems).toHaveLength(6);
    expect(rig.problems[5]).toContain('200 more lines');
    rig.send('#\n');
    expect(rig.problems).toHaveLength(7);
  });

  it('refuses a line without end', async () => {
    const rig = await readyRig();
    rig.send('9'.repeat(100_000));
    rig.send('\n8\n');
    expect(rig.pulls).toEqual([8]);
    expect(rig.problems).toHaveLength(1);
    expect(rig.problems[0]).toContain('line-too-long');
  });

  it('says nothing after detach, and frees the port, even one still opening', async () => {
    const rig = await readyRig();
    const detached = rig.tester.detach();
    rig.send('5\n');
    await detached;
    expect(rig.pulls).toEqual([]);
    expect(rig.openNow).toBe(0);
    expect(rig.time.pending()).toEqual([]);
    await rig.tester.attach();
    await rig.tester.detach();
    expect(rig.opened).toBe(2);
    expect(rig.openNow).toBe(0);
    expect(rig.tester.status().state).toBe('detached');
  });
});
