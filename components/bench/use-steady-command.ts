'use client';

import { useMutation } from '@tanstack/react-query';
import { useRef } from 'react';
import { v7 as uuidv7 } from 'uuid';
import { CommandError, sendCommand } from '../live/use-command';
import { steadyId, type SentCommand } from './steady-id';

/** How long an answer may take before the post counts as out of reach. */
const PATIENCE_MS = 8000;

const withPatience = <Result>(answer: Promise<Result>): Promise<Result> =>
  Promise.race([
    answer,
    new Promise<never>((_resolve, reject) =>
      setTimeout(
        () =>
          reject(
            new CommandError({
              code: 'unreachable',
              title: 'No answer from the post',
              detail: 'The post did not answer.',
            }),
          ),
        PATIENCE_MS,
      ),
    ),
  ]);

export const isUnanswered = (error: CommandError | null): boolean =>
  error?.problem.code === 'unreachable';

/**
 * A command that may be sent again by hand: the same input goes out under the same id until the post
 * has answered it, so that a reading is never taken twice.
 */
export function useSteadyCommand<Input, Result = unknown>(name: string) {
  const sent = useRef<SentCommand | null>(null);
  return useMutation<Result, CommandError, Input>({
    mutationFn: async (input) => {
      sent.current = steadyId(sent.current, input, uuidv7);
      const { id } = sent.current;
      try {
        const result = await withPatience(sendCommand<Result>(name, id, input));
        sent.current = null;
        return result;
      } catch (error) {
        if (!(error instanceof CommandError) || !isUnanswered(error)) sent.current = null;
        throw error;
      }
    },
    networkMode: 'always',
  });
}
