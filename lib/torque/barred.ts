import type { BarredReason } from './verdict';

/** What a tester rests on, as a check sees it. Days are YYYY-MM-DD of the meet's service day. */
export interface TesterStanding {
  lockedReason: string | null;
  certificate: { issuedOn: string; dueOn: string } | null;
  /** The newest proof of this service day. */
  proof: { result: 'passed' | 'failed' } | null;
  today: string;
}

/** What keeps any verdict from being given on this tester today, before a single pull. */
export function barredReasons({
  lockedReason,
  certificate,
  proof,
  today,
}: TesterStanding): BarredReason[] {
  const reasons: BarredReason[] = [];
  if (!certificate || today > certificate.dueOn || today < certificate.issuedOn) {
    reasons.push('tester-out-of-date');
  }
  if (lockedReason !== null) reasons.push('tester-locked');
  if (proof?.result !== 'passed') reasons.push('not-proved-today');
  return reasons;
}
