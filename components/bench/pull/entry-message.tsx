'use client';

import { Kbd } from '../../ui/kbd';
import { Notice } from '../../ui/notice';
import { ProblemNotice } from '../problem-notice';
import type { Entry } from './use-entry';

/** The id of the message, for the field that it is about. */
export const ENTRY_MESSAGE = 'entry-message';

const ERROR_TITLES = { value: 'Tester', toolValue: 'Tool’s display' };

/**
 * What is to be settled about the value in hand, in the place of the instruction; null when nothing
 * is. The buttons and keys that settle it stand below.
 */
export function entryMessage(entry: Pick<Entry, 'doubt' | 'unanswered' | 'refusal' | 'errors'>) {
  if (entry.doubt !== null) {
    return <Notice kind="problem" title={entry.doubt} />;
  }
  if (entry.unanswered) {
    return (
      <Notice kind="problem" title="No answer from the post">
        It is kept. <Kbd>Enter</Kbd> sends it again, once.
      </Notice>
    );
  }
  const fields = (['toolValue', 'value'] as const).filter((field) => entry.errors[field]);
  if (fields.length > 0) {
    return (
      <div id={ENTRY_MESSAGE}>
        <Notice kind="problem">
          {fields.map((field) => (
            <p key={field}>
              <strong>{ERROR_TITLES[field]}:</strong> {entry.errors[field]}
            </p>
          ))}
        </Notice>
      </div>
    );
  }
  return entry.refusal && <ProblemNotice errors={[entry.refusal]} />;
}
