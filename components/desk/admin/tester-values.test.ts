import { describe, expect, it } from 'vitest';
import { testerSchema } from '@/lib/desk/tester';
import type { TesterConnection } from '@/lib/signal/connection';
import { DEFAULT_LINE_PATTERN } from '@/lib/signal/pattern';
import { NEW_TESTER, testerFormValues } from './tester-values';

const known = {
  name: 'T-01',
  maker: 'Harrowgate',
  model: 'HX 500',
  serial: 'HX-0001',
  minNm: 10.25,
  maxNm: 338.95448703454996,
  resolutionNm: 0.1,
  yearlyDriftPercent: 0.2,
  temperatureCoefficientPercentPerK: null,
  correctionApplied: true,
};

const CONNECTIONS: TesterConnection[] = [
  { kind: 'keyed' },
  {
    kind: 'serial',
    path: '/dev/ttyUSB0',
    baudRate: 115200,
    linePattern: DEFAULT_LINE_PATTERN,
    unit: 'lbf.ft',
  },
  { kind: 'simulated', biasPercent: -1.5, scatterPercent: 0.3, seed: 7, secondsPerPull: 2.5 },
];

describe('the form of a tester', () => {
  it.each(CONNECTIONS)('opened and saved changes nothing ($kind)', (connection) => {
    const values = testerFormValues({ ...known, connection });
    const { min, max, resolution, unit, ...rest } = testerSchema.parse(values);
    expect(unit).toBe('N.m');
    expect({ ...rest, minNm: min, maxNm: max, resolutionNm: resolution }).toEqual({
      ...known,
      connection,
    });
  });

  it('keeps what was filled in for a kind of connection while another is chosen', () => {
    const values = testerFormValues({ ...known, connection: CONNECTIONS[1]! });
    expect({ ...values.connection, kind: 'keyed' }).toMatchObject({
      path: '/dev/ttyUSB0',
      baudRate: '115200',
    });
  });

  it('is empty for a new one, and asks for all that it needs', () => {
    const complaints = testerSchema
      .safeParse(NEW_TESTER)
      .error?.issues.map(({ path }) => path.join('.'));
    expect(complaints).toEqual([
      'name',
      'maker',
      'model',
      'serial',
      'min',
      'max',
      'resolution',
      'yearlyDriftPercent',
    ]);
  });
});
