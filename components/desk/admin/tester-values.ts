import type { ConnectionKind, TesterConnection } from '@/lib/signal/connection';
import { DEFAULT_LINE_PATTERN } from '@/lib/signal/pattern';
import type { TorqueUnit } from '@/lib/torque/units';

/** Every field of every kind of connection, so that changing the kind and back loses nothing. */
export interface ConnectionValues {
  kind: ConnectionKind;
  path: string;
  baudRate: string;
  linePattern: string;
  unit: TorqueUnit;
  biasPercent: string;
  scatterPercent: string;
  seed: string;
  secondsPerPull: string;
}

/** A tester as its form holds it. */
export interface TesterValues {
  name: string;
  maker: string;
  model: string;
  serial: string;
  unit: TorqueUnit;
  min: string;
  max: string;
  resolution: string;
  yearlyDriftPercent: string;
  temperatureCoefficientPercentPerK: string;
  correctionApplied: boolean;
  connection: ConnectionValues;
}

const NO_CONNECTION: ConnectionValues = {
  kind: 'keyed',
  path: '',
  baudRate: '9600',
  linePattern: DEFAULT_LINE_PATTERN,
  unit: 'N.m',
  biasPercent: '0',
  scatterPercent: '0.3',
  seed: '1',
  secondsPerPull: '3',
};

export const NEW_TESTER: TesterValues = {
  name: '',
  maker: '',
  model: '',
  serial: '',
  unit: 'N.m',
  min: '',
  max: '',
  resolution: '',
  yearlyDriftPercent: '',
  temperatureCoefficientPercentPerK: '',
  correctionApplied: false,
  connection: NO_CONNECTION,
};

const asText = (values: object): Record<string, string> =>
  Object.fromEntries(Object.entries(values).map(([key, value]) => [key, String(value)]));

interface KnownTester {
  name: string;
  maker: string;
  model: string;
  serial: string;
  minNm: number;
  maxNm: number;
  resolutionNm: number;
  yearlyDriftPercent: number;
  temperatureCoefficientPercentPerK: number | null;
  correctionApplied: boolean;
  connection: TesterConnection;
}

/** A tester that is there, as its form shows it: torques in N·m. */
export function testerFormValues(tester: KnownTester): TesterValues {
  const { name, maker, model, serial, correctionApplied } = tester;
  return {
    name,
    maker,
    model,
    serial,
    correctionApplied,
    unit: 'N.m',
    min: String(tester.minNm),
    max: String(tester.maxNm),
    resolution: String(tester.resolutionNm),
    yearlyDriftPercent: String(tester.yearlyDriftPercent),
    temperatureCoefficientPercentPerK: String(tester.temperatureCoefficientPercentPerK ?? ''),
    connection: { ...NO_CONNECTION, ...asText(tester.connection) },
  };
}
