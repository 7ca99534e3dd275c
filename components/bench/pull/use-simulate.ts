'use client';

import { useMutation } from '@tanstack/react-query';
import { CommandError, type ProblemAnswer } from '../../live/use-command';

/** Asks the simulated tester of this bench for the pull that is due. */
export function useSimulate(benchId: string) {
  return useMutation<void, CommandError, void>({
    networkMode: 'always',
    mutationFn: async () => {
      const response = await fetch(`/api/benches/${benchId}/simulate`, { method: 'POST' }).catch(
        () => null,
      );
      if (response?.ok) return;
      const body: unknown = await response?.json().catch(() => null);
      throw new CommandError(
        (body as ProblemAnswer | null) ?? {
          code: 'unreachable',
          title: 'No answer from the post',
          detail: 'The post did not answer. Try again.',
        },
      );
    },
  });
}
