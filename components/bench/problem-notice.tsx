'use client';

import type { CommandError } from '../live/use-command';
import { Notice } from '../ui/notice';

/** Why the post said no, in its own words; the first of several. */
export function ProblemNotice({ errors }: { errors: readonly (CommandError | null)[] }) {
  const error = errors.find((one) => one !== null);
  if (!error) return null;
  return (
    <Notice kind="problem" title={error.problem.title}>
      {error.problem.detail}
    </Notice>
  );
}
