import { describe, expect, it } from 'vitest';
import { testerConnectionSchema } from './connection';
import { DEFAULT_LINE_PATTERN } from './pattern';

const serial = { kind: 'serial', path: ' /dev/ttyUSB0 ', baudRate: 9600, unit: 'N.m' };

describe('testerConnectionSchema', () => {
  it('takes the three kinds', () => {
    expect(testerConnectionSchema.parse({ kind: 'keyed' })).toEqual({ kind: 'keyed' });
    expect(testerConnectionSchema.parse(serial)).toEqual({
      ...serial,
      path: '/dev/ttyUSB0',
      linePattern: DEFAULT_LINE_PATTERN,
    });
    const simulated = {
      kind: 'simulated',
      biasPercent: -2,
      scatterPercent: 0.4,
      seed: 5,
      secondsPerPull: 2,
    };
    expect(testerConnectionSchema.parse(simulated)).toEqual(simulated);
  });

  it.each([
    [{ kind: 'radio' }],
    [{ ...serial, path: '  ' }],
    [{ ...serial, path: '/dev/tty\nUSB0' }],
    [{ ...serial, baudRate: 9601 }],
    [{ ...serial, unit: 'stone' }],
    [{ ...serial, linePattern: '(\\d+)+' }],
    [{ kind: 'simulated', biasPercent: 90, scatterPercent: 1, seed: 1, secondsPerPull: 1 }],
  ])('refuses %j', (connection) => {
    expect(testerConnectionSchema.safeParse(connection).success).toBe(false);
  });

  it('says what is wrong with a line pattern', () => {
    const result = testerConnectionSchema.safeParse({ ...serial, linePattern: '\\d+' });
    expect(result.error?.issues[0]).toMatchObject({
      path: ['linePattern'],
      message: 'The line pattern needs a group named value: (?<value>…).',
    });
  });
});
