import type { TicketSnapshot } from '@/lib/live/contract';

/** A ticket for tests: A31, waiting, with its visitor. */
export const ticketFixture = (change: Partial<TicketSnapshot> = {}): TicketSnapshot => ({
  revision: 1,
  at: '2026-06-13T09:00:00.000Z',
  code: 'A31',
  state: 'waiting',
  place: 'visitor',
  held: false,
  benchNumber: null,
  peg: null,
  unfitReason: null,
  check: null,
  result: null,
  ...change,
});
