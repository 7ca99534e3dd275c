import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { TicketSnapshot } from '@/lib/live/contract';
import { ticketFixture } from './fixture';
import { Ticket } from './ticket';

const htmlOf = (change: Partial<TicketSnapshot> = {}, joinOpen = true) =>
  renderToStaticMarkup(
    <Ticket
      initial={ticketFixture(change)}
      line={{
        revision: 1,
        at: '2026-06-13T09:00:00.000Z',
        waiting: [
          { code: 'A30', held: false, withUs: false },
          { code: 'A31', held: false, withUs: false },
        ],
      }}
      token="token-of-a31"
      commandId="01900000-0000-7000-8000-990000000001"
      leave={async () => null}
      meet={{ id: 'm', slug: 'test-meet', name: 'Test Meet', timeZone: 'Europe/London', joinOpen }}
      tool="Click wrench"
      plate="60–340 N·m"
      consent="Pulled up to its maximum"
      others={[{ code: 'A35', state: 'waiting', path: '/t/other' }]}
    />,
  );

// As the server sends it: before any script has run.
describe('Ticket', () => {
  it('is whole without a script, and says how fresh it is in the meet’s time', () => {
    const html = htmlOf();
    expect(html).toContain('1 tool before yours');
    expect(html).toContain('Last heard 10:00. Reload to see news.');
    expect(html).toContain('href="/m/test-meet/join?ticket=token-of-a31"');
    expect(html).toContain('href="/t/other"');
  });

  it('can be left while it waits, is called or is away, and not later', () => {
    for (const state of ['waiting', 'called', 'away'] as const) {
      expect(htmlOf({ state })).toContain('Yes, leave the line');
    }
    for (const state of ['on_bench', 'ready', 'returned', 'withdrawn', 'unfit'] as const) {
      expect(htmlOf({ state })).not.toContain('Yes, leave the line');
    }
  });

  it('stands on the signal ground only when called', () => {
    expect(htmlOf({ state: 'called', benchNumber: 2 })).toContain('ground-signal');
    expect(htmlOf({ state: 'on_bench', benchNumber: 2 })).not.toContain('ground-signal');
  });

  it('shows each reading, newest first', () => {
    const html = htmlOf({
      state: 'on_bench',
      check: {
        progress: { done: 7, total: 20 },
        points: [],
        basis: 'reference',
        readings: [
          { label: '68 N·m', reference: '66.1 N·m', words: 'delivers 2.9 % low' },
          { label: '68 N·m', reference: '66.9 N·m', words: 'delivers 1.6 % low' },
        ],
      },
    });
    expect(html.indexOf('66.9 N·m')).toBeLessThan(html.indexOf('66.1 N·m'));
    expect(html).toContain('7 of 20 pulls made');
  });

  it('turns into the result, in the words of the record', () => {
    const statement = 'Within at 45 and 110 N·m (short check)';
    const html = htmlOf({
      state: 'ready',
      place: 'peg',
      peg: 7,
      result: { verdict: 'within', statement, path: '/r/record' },
    });
    expect(html).toContain(statement);
    expect(html).toContain('href="/r/record"');
    expect(html).toContain('peg 7');
  });

  it('says why a tool cannot be checked, escaped', () => {
    expect(htmlOf({ state: 'unfit', place: 'returned', unfitReason: 'Bent <b>' })).toContain(
      'Bent &lt;b&gt;',
    );
  });

  it('offers no further tool while the line is closed', () => {
    expect(htmlOf({}, false)).not.toContain('Add another tool');
  });
});
