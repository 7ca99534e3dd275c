import { certificates, testers } from '@/db/schema';
import type { Database } from '@/db/client';
import type { TesterConnection } from '@/lib/signal/connection';
import { DIRECTIONS } from '@/lib/torque/terms';
import type { CertificatePoint } from '@/lib/torque/tester';
import { fixedId, POST_ID, TESTER_IDS } from './ids';

const MS_A_DAY = 86_400_000;

const day = (instant: Date, days: number): string =>
  new Date(instant.getTime() + days * MS_A_DAY).toISOString().slice(0, 10);

/** Certified points in both directions: torque in N·m, error and expanded uncertainty in per cent. */
const pointsOf = (rows: readonly (readonly [number, number, number])[]): CertificatePoint[] =>
  DIRECTIONS.flatMap((direction) =>
    rows.map(([torqueNm, errorPercent, expandedPercent]) => ({
      direction,
      torqueNm,
      // The arm of a transducer is seldom quite the same the other way round.
      errorPercent: direction === 'cw' ? errorPercent : -errorPercent,
      expandedPercent,
      k: 2,
    })),
  );

const SIMULATED: TesterConnection = {
  kind: 'simulated',
  biasPercent: 1.1,
  scatterPercent: 0.5,
  seed: 20_417,
  secondsPerPull: 2,
};

const TESTERS = [
  {
    id: TESTER_IDS[0],
    name: 'T-01',
    maker: 'Ludwen',
    model: 'Bench 500',
    serial: 'LW-50-3317',
    minNm: 5,
    maxNm: 500,
    resolutionNm: 0.01,
    yearlyDriftPercent: 0.2,
    temperatureCoefficientPercentPerK: 0.01,
    correctionApplied: true,
    connection: SIMULATED,
    certificate: { id: fixedId(0x41), number: 'FFL-26-0318', issued: -140 },
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
  {
    id: TESTER_IDS[1],
    name: 'T-02',
    maker: 'Ludwen',
    model: 'Bench 1000',
    serial: 'LW-100-0942',
    minNm: 20,
    maxNm: 1000,
    resolutionNm: 0.1,
    yearlyDriftPercent: 0.3,
    temperatureCoefficientPercentPerK: null,
    correctionApplied: false,
    connection: { kind: 'keyed' } satisfies TesterConnection,
    certificate: { id: fixedId(0x42), number: 'FFL-26-0511', issued: -61 },
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
] as const;

/** Two testers, each with a certificate that holds for most of another year. */
export async function addTesters(db: Database, createdAt: Date): Promise<void> {
  for (const { certificate, points, ...tester } of TESTERS) {
    await db
      .insert(testers)
      .values({ ...tester, postId: POST_ID, createdAt })
      .onConflictDoNothing();
    await db
      .insert(certificates)
      .values({
        id: certificate.id,
        testerId: tester.id,
        number: certificate.number,
        laboratory: 'Fennick Force Laboratory',
        accreditation: 'invented, 0417',
        issuedOn: day(createdAt, certificate.issued),
        dueOn: day(createdAt, certificate.issued + 365),
        traceability: 'Invented for the rehearsal; traceable to nothing.',
        temperatureC: 21,
        points,
        createdAt,
      })
      .onConflictDoNothing();
  }
}
