import { describe, expect, it } from 'vitest';
import { TAG_STATES } from '@/lib/line/states';
import { ticketFixture } from './fixture';
import { ticketTitle, ticketWords, toolsBefore } from './words';

const tag = (code: string, held = false) => ({ code, held, withUs: false });

describe('toolsBefore', () => {
  it('counts what will be taken first, and lets held turns pass', () => {
    const waiting = [tag('A01', true), tag('A02'), tag('A03')];
    expect(toolsBefore(waiting, 'A01')).toBe(0);
    expect(toolsBefore(waiting, 'A02')).toBe(0);
    expect(toolsBefore(waiting, 'A03')).toBe(1);
    expect(toolsBefore(waiting, 'A04')).toBeNull();
  });
});

describe('ticketWords', () => {
  it('has words of its own for every state', () => {
    const headlines = TAG_STATES.map(
      (state) => ticketWords(ticketFixture({ state, benchNumber: 2 }), 3).headline,
    );
    expect(new Set(headlines).size).toBe(TAG_STATES.length);
  });

  it.each([
    [0, 'You are next'],
    [1, '1 tool before yours'],
    [3, '3 tools before yours'],
    [null, 'In the line'],
  ])('%s before', (before, headline) => {
    expect(ticketWords(ticketFixture(), before).headline).toBe(headline);
  });

  it('says that a turn is held before it says its place', () => {
    expect(ticketWords(ticketFixture({ held: true }), 0).headline).toBe('Your turn is held');
  });

  it('does not ask the owner of a tool on a peg to stay', () => {
    expect(ticketWords(ticketFixture({ place: 'peg', peg: 4 }), 0).detail).toContain(
      'need not stay',
    );
  });

  it('says where a tool is to be collected, also after the visitor has left the line', () => {
    const peg = ticketFixture({ state: 'ready', place: 'peg', peg: 7 });
    expect(ticketWords(peg, null).detail).toContain('peg 7');
    const left = ticketFixture({ state: 'withdrawn', place: 'bench', benchNumber: 1 });
    expect(ticketWords(left, null).detail).toContain('bench 1');
    expect(ticketWords(ticketFixture({ state: 'withdrawn', place: 'returned' }), null).detail).toBe(
      '',
    );
  });

  it('carries code and state in the title', () => {
    expect(ticketTitle(ticketFixture({ state: 'called', benchNumber: 2 }), null)).toBe(
      'A31 · Come to bench 2 now',
    );
  });
});
