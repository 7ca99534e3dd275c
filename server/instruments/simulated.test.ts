import { describe, expect, it } from 'vitest';
import type { SimulatedConnection } from '@/lib/signal/connection';
import { createManualTime } from '@/tests/support/manual-time';
import type { InstrumentPull } from './instrument';
import { createKeyedInstrument } from './keyed';
import { createSimulatedInstrument, isSimulated } from './simulated';

const connection = {
  kind: 'simulated' as const,
  biasPercent: 4,
  scatterPercent: 0,
  seed: 1,
  secondsPerPull: 2,
} satisfies SimulatedConnection;
const target = { targetNm: 104, direction: 'cw' } as const;

async function attached(options: Partial<SimulatedConnection> & { autoplay?: boolean } = {}) {
  const { autoplay, ...changes } = options;
  const time = createManualTime();
  const tester = createSimulatedInstrument({ ...connection, ...changes }, { ...time, autoplay });
  const pulls: InstrumentPull[] = [];
  tester.on('pull', (pull) => pulls.push(pull));
  await tester.attach();
  return { time, tester, pulls };
}

describe('simulated instrument', () => {
  it('plays one pull of its tool after its seconds a pull', async () => {
    const { time, tester, pulls } = await attached();
    expect(tester.play(target)).toBe(true);
    await time.advance(1999);
    expect(pulls).toEqual([]);
    await time.advance(1);
    // 104 said by a tool that says 4 % more than it delivers: 104/1.04 = 100.
    expect(pulls).toEqual([{ valueNm: 100, direction: 'cw', raw: '+100.00 N.m', at: time.now() }]);
  });

  it('pulls from what the tool says when that is not the target', async () => {
    const { time, tester, pulls } = await attached();
    tester.play({ targetNm: 50, toolValueNm: 52, direction: 'ccw' });
    await time.advance(2000);
    expect(pulls[0]).toMatchObject({ valueNm: 50, direction: 'ccw', raw: '-50.000 N.m' });
  });

  it('gives the same readings for the same seed, others for another', async () => {
    const run = async (seed: number) => {
      const { time, tester, pulls } = await attached({ seed, scatterPercent: 1 });
      for (let pull = 0; pull < 5; pull += 1) {
        tester.play(target);
        await time.advance(2000);
      }
      return pulls.map(({ valueNm }) => valueNm);
    };
    const first = await run(7);
    expect(new Set(first).size).toBe(5);
    expect(await run(7)).toEqual(first);
    expect(await run(8)).not.toEqual(first);
  });

  it('waits for the trigger without autoplay, and pulls once for each', async () => {
    const { time, tester, pulls } = await attached();
    expect(tester.trigger()).toBe(false);
    tester.expect(target);
    await time.advance(60_000);
    expect(pulls).toHaveLength(0);
    expect(tester.trigger()).toBe(true);
    expect(tester.trigger()).toBe(false);
    await time.advance(60_000);
    expect(pulls).toHaveLength(1);
  });

  it('plays each expected pull by itself with autoplay, and no more', async () => {
    const { time, tester, pulls } = await attached({ autoplay: true });
    tester.expect(target);
    await time.advance(60_000);
    expect(pulls).toHaveLength(1);
    tester.expect(target);
    tester.expect({ ...target });
    await time.advance(60_000);
    expect(pulls).toHaveLength(2);
    tester.setAutoplay(false);
    tester.setAutoplay(true);
    await time.advance(60_000);
    expect(pulls).toHaveLength(2);
  });

  it('calls off a pull towards something no longer expected', async () => {
    const { time, tester, pulls } = await attached({ autoplay: true });
    tester.expect(target);
    await time.advance(1000);
    tester.expect({ targetNm: 52, direction: 'ccw' });
    await time.advance(1500);
    expect(pulls).toEqual([]);
    await time.advance(500);
    expect(pulls).toMatchObject([{ valueNm: 50, direction: 'ccw' }]);
    tester.expect(target);
    tester.expect(null);
    await time.advance(60_000);
    expect(pulls).toHaveLength(1);
  });

  it('gives nothing once detached, and refuses impossible torques', async () => {
    const { time, tester, pulls } = await attached();
    tester.play(target);
    await tester.detach();
    await time.advance(60_000);
    expect(pulls).toEqual([]);
    expect(tester.play(target)).toBe(false);
    expect(tester.status().state).toBe('detached');
    expect(() => tester.play({ targetNm: 0, direction: 'cw' })).toThrow(RangeError);
    expect(() => tester.play({ ...target, toolValueNm: Number.NaN })).toThrow(RangeError);
  });

  it('says in its status that its readings are not real', async () => {
    const { tester } = await attached();
    expect(tester.status().message).toContain('not real');
  });
});

describe('keyed instrument', () => {
  it('tells its status, once for each change, until nobody listens', async () => {
    const tester = createKeyedInstrument(createManualTime());
    const states: string[] = [];
    const stop = tester.on('status', ({ state }) => states.push(state));
    await tester.attach();
    await tester.attach();
    await tester.detach();
    stop();
    await tester.attach();
    expect(isSimulated(tester)).toBe(false);
    expect(states).toEqual(['ready', 'detached']);
    expect(tester.status().state).toBe('ready');
  });
});
