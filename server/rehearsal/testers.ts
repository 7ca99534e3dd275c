import type { CertificateInput } from '@/lib/desk/certificate';
import type { ProofInput } from '@/lib/desk/proof';
import type { TesterInput } from '@/lib/desk/tester';
import { DIRECTIONS } from '@/lib/torque/terms';

export interface CastTester {
  tester: TesterInput;
  certificate: Pick<CertificateInput, 'number' | 'points'> & { issuedDaysAgo: number };
  /** This morning's proof; `at` in minutes before the rehearsal opened. */
  proof: Omit<ProofInput, 'testerId'> & { at: number };
}

/** Certified points in both directions: torque in N·m, error and expanded uncertainty in per cent. */
const pointsOf = (rows: readonly (readonly [number, number, number])[]) =>
  DIRECTIONS.flatMap((direction) =>
    rows.map(([torque, errorPercent, expandedPercent]) => ({
      direction,
      torque,
      // A transducer is seldom quite the same the other way round.
      errorPercent: direction === 'cw' ? errorPercent : -errorPercent,
      expandedPercent,
      k: 2,
    })),
  );

const deadWeight = { method: 'dead-weight', unit: 'N.m', limitPercent: 0.5 } as const;

/** One tester a bench. The second bench has begun before its tester is proved. */
export const CAST_TESTERS: readonly CastTester[] = [
  {
    tester: {
      name: 'T-01',
      maker: 'Ludwen',
      model: 'Bench 500',
      serial: 'LW-50-3317',
      unit: 'N.m',
      min: 5,
      max: 500,
      resolution: 0.01,
      yearlyDriftPercent: 0.2,
      temperatureCoefficientPercentPerK: 0.01,
      correctionApplied: true,
      connection: {
        kind: 'simulated',
        biasPercent: 1.1,
        scatterPercent: 0.5,
        seed: 20_417,
        secondsPerPull: 2,
      },
    },
    certificate: {
      number: 'FFL-0318',
      issuedDaysAgo: 140,
      points: pointsOf([
        [5, 0.18, 0.4],
        [10, 0.15, 0.35],
        [25, 0.12, 0.3],
        [50, 0.1, 0.25],
        [100, 0.08, 0.2],
        [200, 0.05, 0.2],
        [350, -0.04, 0.2],
        [500, -0.09, 0.2],
      ]),
    },
    proof: { ...deadWeight, at: 168, load: 98.13, reading: 98.19, note: '10 kg at 1 m' },
  },
  {
    tester: {
      name: 'T-02',
      maker: 'Ludwen',
      model: 'Bench 1000',
      serial: 'LW-100-0942',
      unit: 'N.m',
      min: 20,
      max: 1000,
      resolution: 0.1,
      yearlyDriftPercent: 0.3,
      temperatureCoefficientPercentPerK: null,
      correctionApplied: false,
      connection: { kind: 'keyed' },
    },
    certificate: {
      number: 'FFL-0511',
      issuedDaysAgo: 61,
      points: pointsOf([
        [20, 0.1, 0.4],
        [50, 0.09, 0.3],
        [100, 0.06, 0.25],
        [200, 0.04, 0.25],
        [400, -0.03, 0.25],
        [700, -0.06, 0.25],
        [1000, -0.1, 0.25],
      ]),
    },
    proof: { ...deadWeight, at: 145, load: 196.26, reading: 196.4, note: '20 kg at 1 m' },
  },
];

const MS_A_DAY = 86_400_000;
const day = (instant: Date, days: number): string =>
  new Date(instant.getTime() + days * MS_A_DAY).toISOString().slice(0, 10);

/** A tester's certificate: issued some weeks before `now`, due a year after that. */
export const certificateInput = (
  testerId: string,
  { certificate: { issuedDaysAgo, ...certificate } }: CastTester,
  now: Date,
): CertificateInput => ({
  ...certificate,
  testerId,
  laboratory: 'Fennick Force Laboratory',
  accreditation: 'invented, 0417',
  issuedOn: day(now, -issuedDaysAgo),
  dueOn: day(now, 365 - issuedDaysAgo),
  traceability: 'Invented for the rehearsal; traceable to nothing.',
  temperatureC: 21,
  unit: 'N.m',
});
