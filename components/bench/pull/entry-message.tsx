'use client';

import { Kbd } from '../../ui/kbd';
import { Notice } from '../../ui/notice';
import { ProblemNotice } from '../problem-notice';
import type { Entry } from './use-entry';

/** What the post asks or says about the value in hand; null when it has nothing to say. */
export function entryMessage(entry: Pick<Entry, 'doubt' | 'unanswered' | 'refusal'>) {
  if (entry.doubt !== null) {
    return (
      <Notice kind="problem" title={entry.doubt}>
        <Kbd>Enter</Kbd> again to take it, <Kbd>Esc</Kbd> to retype.
      </Notice>
    );
  }
  if (entry.unanswered) {
    return (
      <Notice kind="problem" title="No answer from the post">
        What you typed is kept. <Kbd>Enter</Kbd> sends it again; it is never taken twice.
      </Notice>
    );
  }
  return entry.refusal && <ProblemNotice errors={[entry.refusal]} />;
}
