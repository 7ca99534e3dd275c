'use client';

import type { CheckView } from '@/lib/live/contract';
import { lastAccepted, pullValue } from './pull/pull-words';

/** What was taken and what comes next, in words for those who do not see the screen. */
export function announcement(check: CheckView | null): string {
  if (!check) return '';
  const last = lastAccepted(check.pulls);
  const taken = last ? `Taken: pull ${last.sequence}, ${pullValue(last)}. ` : '';
  if (!check.step) return `${taken}${check.statement}.`;
  const { heading, targetLabel, unitLabel, pullWords } = check.step;
  return `${taken}Next: ${heading}, ${targetLabel} ${unitLabel}, ${pullWords.toLowerCase()}.`;
}

/** Speaks each accepted pull as it is taken. */
export function Announcer({ check }: { check: CheckView | null }) {
  return (
    <p role="status" className="sr-only">
      {announcement(check)}
    </p>
  );
}
