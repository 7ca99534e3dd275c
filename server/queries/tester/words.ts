import type { certificates, testerProofs } from '@/db/schema';
import { dateWords, timeWords } from '@/lib/format/time';
import { formatTorque } from '@/lib/torque/units';

/** 'certificate to 14 Mar 2027' */
export const certificateWords = (
  certificate: Pick<typeof certificates.$inferSelect, 'dueOn'> | null,
): string => (certificate ? `certificate to ${dateWords(certificate.dueOn)}` : 'no certificate');

/** 'proved 07:41 at 100 N·m' */
export function proofWords(
  proof: typeof testerProofs.$inferSelect | null,
  timeZone: string,
): string {
  if (!proof) return 'not proved today';
  const at = `${timeWords(proof.at, timeZone)} at ${formatTorque(proof.loadNm, 'N.m')}`;
  return proof.result === 'passed' ? `proved ${at}` : `proof failed ${at}`;
}
