import { desc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Reader } from '@/db/client';
import { certificates, staff, testerProofs } from '@/db/schema';
import { errorWords, PROOF_METHOD_WORDS, proofOutcome } from '@/lib/desk/proof';
import { dateWords, dayWords, timeWords } from '@/lib/format/time';
import { serviceDay } from '@/lib/time/service-day';
import type { TesterConnection } from '@/lib/signal/connection';
import type { CertificatePoint } from '@/lib/torque/tester';
import { formatNumber, formatTorque } from '@/lib/torque/units';
import { reasonWords } from '@/lib/torque/words';
import type { InstrumentManager } from '@/server/instruments/manager';
import { testerToday } from '@/server/queries/tester/standing';
import { whereOf } from './list';

export interface CertificateView {
  id: string;
  number: string;
  laboratory: string;
  accreditation: string;
  issued: string;
  due: string;
  traceability: string;
  temperature: string | null;
  points: CertificatePoint[];
  /** The one that checks rest on today. */
  holds: boolean;
  /** Its due date has passed. */
  ended: boolean;
}

export interface ProofView {
  id: string;
  when: string;
  today: boolean;
  method: string;
  load: string;
  reading: string;
  error: string;
  limit: string;
  result: 'passed' | 'failed';
  by: string;
  note: string | null;
}

/** A tester with everything that its page and its forms show. Torques in N·m. */
export interface TesterPage {
  id: string;
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
  lockedReason: string | null;
  bench: string | null;
  /** How its connection stands; null for one that stands on no bench. */
  status: { state: 'detached' | 'connecting' | 'ready' | 'lost'; words: string } | null;
  barred: string[];
  certificates: CertificateView[];
  proofs: ProofView[];
  /** There are older proofs than those listed. */
  moreProofs: boolean;
}

const PROOFS_SHOWN = 30;

interface Source {
  reader: Reader;
  now: Date;
  instruments: Pick<InstrumentManager, 'status'>;
}

/** The tester of an id from an address; null when it is none, or of no tester. */
export async function testerPage(
  { reader, now, instruments }: Source,
  testerId: string,
): Promise<TesterPage | null> {
  if (!z.uuid().safeParse(testerId).success) return null;
  const { where, bench } = await whereOf(reader, testerId, now);
  const today = await testerToday(reader, testerId, where, now);
  if (!today) return null;
  const { tester } = today;
  const papers = await reader
    .select()
    .from(certificates)
    .where(eq(certificates.testerId, testerId))
    .orderBy(desc(certificates.issuedOn), desc(certificates.createdAt));
  const proofs = await reader
    .select({ proof: testerProofs, by: staff.name })
    .from(testerProofs)
    .innerJoin(staff, eq(staff.id, testerProofs.byStaffId))
    .where(eq(testerProofs.testerId, testerId))
    .orderBy(desc(testerProofs.at))
    .limit(PROOFS_SHOWN + 1);
  const status = bench === null ? null : instruments.status(testerId);
  const dayOf = (at: Date) => serviceDay(at, where.timeZone, where.dayStartHour);
  return {
    id: tester.id,
    name: tester.name,
    maker: tester.maker,
    model: tester.model,
    serial: tester.serial,
    minNm: tester.minNm,
    maxNm: tester.maxNm,
    resolutionNm: tester.resolutionNm,
    yearlyDriftPercent: tester.yearlyDriftPercent,
    temperatureCoefficientPercentPerK: tester.temperatureCoefficientPercentPerK,
    correctionApplied: tester.correctionApplied,
    connection: tester.connection,
    lockedReason: tester.lockedReason,
    bench,
    status: status && { state: status.state, words: status.message },
    barred: today.barred.map((code) => reasonWords(code)),
    certificates: papers.map((paper) => ({
      id: paper.id,
      number: paper.number,
      laboratory: paper.laboratory,
      accreditation: paper.accreditation,
      issued: dateWords(paper.issuedOn),
      due: dateWords(paper.dueOn),
      traceability: paper.traceability,
      temperature: paper.temperatureC === null ? null : `${formatNumber(paper.temperatureC)} °C`,
      points: paper.points,
      holds: paper.id === today.certificate?.id && paper.dueOn >= dayOf(now),
      ended: paper.dueOn < dayOf(now),
    })),
    proofs: proofs.slice(0, PROOFS_SHOWN).map(({ proof, by }) => ({
      id: proof.id,
      when: `${dayWords(proof.at, where.timeZone)}, ${timeWords(proof.at, where.timeZone)}`,
      today: dayOf(proof.at) === dayOf(now),
      method: PROOF_METHOD_WORDS[proof.method],
      load: formatTorque(proof.loadNm, 'N.m'),
      reading: formatTorque(proof.readingNm, 'N.m', { division: tester.resolutionNm }),
      error: errorWords(
        proofOutcome({
          load: proof.loadNm,
          reading: proof.readingNm,
          limitPercent: proof.limitPercent,
        }).errorPercent,
      ),
      limit: `±${formatNumber(proof.limitPercent)} %`,
      result: proof.result,
      by,
      note: proof.note,
    })),
    moreProofs: proofs.length > PROOFS_SHOWN,
  };
}
