import type { Database } from '@/db/client';
import { certificates, testerProofs, testers } from '@/db/schema';
import type { CertificatePoint } from '@/lib/torque/tester';
import { fixedId } from './ids';
import { TEST_NOW } from './store';

type Insert<Table extends { $inferInsert: object }> = Partial<Table['$inferInsert']>;

const createdAt = new Date('2026-06-01T12:00:00Z');

/** Both directions of a 10 to 500 N·m tester that reads without error, U 0.3 %, k 2. */
export const TEST_POINTS: CertificatePoint[] = (['cw', 'ccw'] as const).flatMap((direction) =>
  [10, 50, 100, 250, 500].map((torqueNm) => ({
    direction,
    torqueNm,
    errorPercent: 0,
    expandedPercent: 0.3,
    k: 2,
  })),
);

export const makeTester = async (db: Database, values: Insert<typeof testers> = {}) => {
  const [tester] = await db
    .insert(testers)
    .values({
      id: fixedId('tester'),
      postId: fixedId('post'),
      name: 'T-01',
      maker: 'Harrowgate',
      model: 'HX 500',
      serial: 'HX-0001',
      minNm: 10,
      maxNm: 500,
      resolutionNm: 0.1,
      yearlyDriftPercent: 0.2,
      temperatureCoefficientPercentPerK: 0.01,
      connection: { kind: 'keyed' },
      createdAt,
      ...values,
    })
    .returning();
  return tester!;
};

/** Valid at `TEST_NOW` for another nine months, unless other dates are given. */
export const makeCertificate = async (db: Database, values: Insert<typeof certificates> = {}) => {
  const [certificate] = await db
    .insert(certificates)
    .values({
      id: fixedId('certificate'),
      testerId: fixedId('tester'),
      number: 'C-2026-0117',
      laboratory: 'Quern Laboratory',
      accreditation: 'Q-0042',
      issuedOn: '2026-03-14',
      dueOn: '2027-03-14',
      traceability: 'To the SI through the national standard of torque',
      temperatureC: 20,
      points: TEST_POINTS,
      createdAt,
      ...values,
    })
    .returning();
  return certificate!;
};

/** Passed with a dead weight at 100 N·m, ninety minutes before `TEST_NOW`. */
export const makeProof = async (db: Database, values: Insert<typeof testerProofs> = {}) => {
  const [proof] = await db
    .insert(testerProofs)
    .values({
      id: fixedId('proof'),
      testerId: fixedId('tester'),
      method: 'dead-weight',
      loadNm: 100,
      readingNm: 100.1,
      limitPercent: 0.5,
      result: 'passed',
      at: new Date(TEST_NOW.getTime() - 90 * 60_000),
      byStaffId: fixedId('staff', 2),
      ...values,
    })
    .returning();
  return proof!;
};
