import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { BenchSnapshot, CheckView } from '@/lib/live/contract';
import { announcement } from './announcer';
import { BenchScreen } from './bench-screen';
import { benchSnapshot, checkView, pullView, stepView, tagView } from './fixtures';

const tool = {
  toolClass: 'II-A' as const,
  classUnsure: false,
  rangeMin: 60,
  rangeMax: 340,
  unit: 'N.m' as const,
  division: 2,
  nominal: null,
  claim: null,
  measuresCcw: false,
  drive: null,
  maker: null,
  serial: null,
  workingPoints: null,
};

/** The screen as the post sends it, before any script has run. */
const screen = (bench: BenchSnapshot, check: CheckView | null = null) =>
  renderToStaticMarkup(
    <BenchScreen
      bench={bench}
      check={{ revision: 1, at: bench.at, check }}
      me={{ id: 'me', name: 'Olive Pike', role: 'operator' }}
      signOut={null}
    />,
  );
const lying = (values: Partial<BenchSnapshot> = {}) =>
  benchSnapshot({ tag: tagView({ state: 'on_bench', place: 'bench' }), tool, ...values });

describe('BenchScreen', () => {
  it('calls the first tag whose turn is not held', () => {
    const next = [
      tagView({ id: 'a', code: 'A30', heldUntil: '2026-06-13T10:00:00Z' }),
      tagView({ id: 'b', code: 'A31', place: 'peg', peg: 4 }),
    ];
    const html = screen(benchSnapshot({ next, waitingCount: 2 }));
    expect(html).toContain('Take A31 from peg 4');
    expect(html).toContain('held to 11:00');
    expect(html).not.toContain('Call A30');
  });

  it.each(['free', 'start'] as const)(
    'says before the first pull that nothing is judged: %s',
    (at) => {
      const bench = at === 'free' ? benchSnapshot() : lying();
      bench.tester!.barred = ['the tester was not proved today'];
      expect(screen(bench)).toContain(
        'Every verdict on this bench will be “not judged”, because the tester was not proved today',
      );
    },
  );

  it('leads the pull: set point, torque, pull, instruction and where to stop', () => {
    const html = screen(lying(), checkView());
    for (const words of [
      'Set point 2 of 3, clockwise',
      'Pull 4 of 5',
      'Leave it at 204 N·m',
      'Stop pulling at 265.2 N·m.',
      'Last reading, at 204 N·m',
    ]) {
      expect(html).toContain(words);
    }
  });

  it('shows no verdict shape while pulls are due', () => {
    const shape = screen(lying(), checkView()).includes('#009e73');
    expect(shape).toBe(false);
  });

  it('asks for the display of an indicating tool beside a value of the tester', () => {
    const offered = pullView({ state: 'offered', words: null });
    const check = checkView({ setting: false, offered, offeredStep: stepView() });
    const bench = lying();
    bench.tester!.kind = 'serial';
    const html = screen(bench, check);
    expect(html).toContain('The tester sent');
    expect(html).toContain('Tool’s display');
    expect(html).not.toContain('Tester shows');
  });

  it('names what is missing of a check that was stopped early', () => {
    const check = checkView({
      step: null,
      stoppedEarly: true,
      missing: ['reading 5 of 5 at 340 N·m clockwise'],
    });
    const html = screen(lying(), check);
    expect(html).toContain('Stopped early.');
    expect(html).toContain('reading 5 of 5 at 340 N·m clockwise');
  });

  it('says at once that the cable is out, and escapes what the tester sent', () => {
    const bench = lying();
    bench.tester!.instrument = { state: 'lost', message: '<script>' };
    const html = screen(bench, checkView());
    expect(html).toContain('look at its cable');
    expect(html).toContain('&lt;script&gt;');
  });

  it('leaves somebody else’s bench alone', () => {
    const bench = lying();
    bench.bench.operator = { id: 'other', name: 'Wren' };
    const html = screen(bench, checkView());
    expect(html).toContain('Wren works here');
    expect(html).not.toContain('Stop pulling');
    expect(html).toContain('aria-disabled="true"');
  });
});

describe('announcement', () => {
  it('says what was taken and what comes next', () => {
    expect(announcement(checkView())).toBe(
      'Taken: pull 13, 201.6 N·m, delivers 1.2 % low. Next: Set point 2 of 3, clockwise, 204 N·m, pull 4 of 5.',
    );
    expect(announcement(null)).toBe('');
  });
});
