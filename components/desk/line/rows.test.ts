import { expect, it } from 'vitest';
import { deskOf, deskTag } from './fixture';
import { lineRows } from './rows';

it('puts called and busy tags first, then the line in its order, then the rest', () => {
  const rows = lineRows(
    deskOf([
      deskTag('A09', { state: 'ready', place: 'peg', peg: 3 }),
      deskTag('A05'),
      deskTag('A02'),
      deskTag('A03', { state: 'on_bench', place: 'bench', benchNumber: 1 }),
      deskTag('A01', { state: 'called', benchNumber: 2 }),
      deskTag('A04', { state: 'away' }),
    ]),
  );
  expect(rows.map((row) => [row.tag.code, row.place])).toEqual([
    ['A01', null],
    ['A03', null],
    ['A05', 1],
    ['A02', 2],
    ['A04', null],
    ['A09', null],
  ]);
  expect(rows.map((row) => row.state)).toEqual([
    'Called to bench 2',
    'On the bench',
    'Waiting',
    'Waiting',
    'Away',
    'Ready to collect',
  ]);
  expect(rows.map((row) => row.where)).toEqual([
    'visitor',
    'bench 1',
    'visitor',
    'visitor',
    'visitor',
    'peg 3',
  ]);
});

it('says that a turn is held, and not what only a stale time says', () => {
  const desk = deskOf([deskTag('A01', { heldUntil: '2026-06-13T09:10:00.000Z' }), deskTag('A02')]);
  expect(lineRows(desk).map((row) => row.state)).toEqual(['Waiting, held', 'Waiting']);
  desk.line.waiting[0]!.held = false;
  expect(lineRows(desk)[0]!.isHeld).toBe(false);
});
