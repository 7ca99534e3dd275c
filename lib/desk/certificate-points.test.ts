import { describe, expect, it } from 'vitest';
import {
  outsideRangeFault,
  parsePoints,
  pointsFault,
  pointsInNm,
  type PrintedPoint,
} from './certificate-points';

const point = (change: Partial<PrintedPoint> = {}): PrintedPoint => ({
  direction: 'cw',
  torque: 10,
  errorPercent: 0.12,
  expandedPercent: 0.3,
  k: 2,
  ...change,
});

describe('parsePoints', () => {
  it.each([
    ['tabs and decimal commas', 'cw\t10\t0,12\t0,30\t2'],
    ['tabs and decimal points', 'cw\t10\t0.12\t0.30\t2'],
    ['semicolons', 'cw; 10; 0,12; 0,30; 2'],
    ['semicolons at the end too', 'cw;10;0,12;0,30;2;'],
    ['commas with blanks', 'cw, 10, 0.12, 0.30, 2'],
    ['blanks', '  CW  10  0.12  0.30  2 '],
    ['signs and per cent', 'clockwise\t10\t+0.12 %\t0.30%\t2'],
    [
      'headings and empty rows',
      'Direction\tTorque\tError\tU\tk\r\n\r\ncw\t10\t0.12\t0.3\t2\r\n\r\n',
    ],
  ])('reads rows with %s', (_what, text) => {
    expect(parsePoints(text)).toMatchObject({ points: [point()] });
  });

  it('reads a negative error with a hyphen and with a true minus', () => {
    for (const minus of ['-', '−']) {
      expect(parsePoints(`ccw 10 ${minus}0.12 0.3 2`)).toMatchObject({
        points: [point({ direction: 'ccw', errorPercent: -0.12 })],
      });
    }
  });

  it.each([
    ['', 'Give the certificate’s points'],
    ['cw 10 0.1 0.3 2\ncw 20 0.1 0.3', 'Row 2 has 4 values'],
    ['cw 10 0.1 0.3 2\n\nup 20 0.1 0.3 2', 'Row 3 begins with the direction'],
    ['cw 10 0.1 0.3 2\ncw 20 zero 0.3 2', 'Row 2: ‘zero’ is no number'],
    ['cw\t1,000.5\t0.1\t0.3\t2', 'Row 1: ‘1,000.5’ is no number'],
    ['cw 10 0.1 0.3 1e3', 'Row 1: ‘1e3’ is no number'],
    ['cw\t10\t\t0.3\t2', 'Row 1 has an empty cell'],
    [Array.from({ length: 61 }, () => 'cw 10 0.1 0.3 2').join('\n'), 'at most 60 points'],
  ])('says what is wrong with %j', (text, words) => {
    const parsed = parsePoints(text);
    expect('fault' in parsed ? parsed.fault : null).toContain(words);
  });
});

describe('pointsFault', () => {
  const pair = [point(), point({ torque: 500 })];

  it('finds nothing wrong with two points in each direction, in any order of directions', () => {
    expect(pointsFault(pair)).toBeNull();
    expect(
      pointsFault([...pair, point({ direction: 'ccw' }), point({ direction: 'ccw', torque: 50 })]),
    ).toBeNull();
  });

  it.each([
    ['torques that fall', [point({ torque: 50 }), point()], 'Row 2: torques rise'],
    ['a torque twice', [point(), point()], 'Row 2: torques rise'],
    [
      'one point in a direction',
      [...pair, point({ direction: 'ccw' })],
      'Counter-clockwise has one point only',
    ],
    ['a torque of zero', [point({ torque: 0 }), point()], 'Row 1: the torque must be above zero'],
    [
      'no uncertainty',
      [point(), point({ torque: 50, expandedPercent: 0 })],
      'Row 2: the uncertainty',
    ],
    ['k below 1', [point({ k: 0.9 })], 'Row 1: k lies'],
    ['k above 4', [point({ k: 4.1 })], 'Row 1: k lies'],
    ['an error of ten per cent', [point({ errorPercent: -10 })], 'Row 1: an error'],
    ['NaN', [point({ errorPercent: Number.NaN })], 'Row 1: an error'],
    ['nothing', [], 'needs points'],
  ])('refuses %s', (_what, points, words) => {
    expect(pointsFault(points)).toContain(words);
  });
});

it('counts rows as they stand on screen, with headings and gaps', () => {
  const parsed = parsePoints(
    'Direction\tTorque\tError\tU\tk\n\ncw\t10\t0\t0.3\t2\ncw\t50\t0\t0.3\t9',
  );
  if ('fault' in parsed) throw new Error(parsed.fault);
  expect(pointsFault(parsed.points, parsed.rows)).toContain('Row 4: k lies');
});

describe('outsideRangeFault', () => {
  it('lets a point stand 2 % above the range, and no higher', () => {
    const at = (torque: number) => pointsInNm([point(), point({ torque })], 'N.m');
    expect(outsideRangeFault(at(510), { maxNm: 500 }, 'N.m')).toBeNull();
    expect(outsideRangeFault(at(511), { maxNm: 500 }, 'N.m')).toContain('Point 2, 511 N·m');
  });

  it('speaks in the unit of the certificate', () => {
    const points = pointsInNm([point({ torque: 500 })], 'lbf.ft');
    expect(outsideRangeFault(points, { maxNm: 500 }, 'lbf.ft')).toContain('500 lbf·ft, is above');
  });
});
