'use client';

import { useMutation } from '@tanstack/react-query';
import { v7 as uuidv7 } from 'uuid';

/** RFC 9457, as every route of ours answers an error. */
export interface ProblemAnswer {
  code: string;
  title: string;
  detail: string;
  fields?: Record<string, string>;
  question?: string;
}

/** A refusal by the post, or no answer from it (`code` is `unreachable`). */
export class CommandError extends Error {
  constructor(readonly problem: ProblemAnswer) {
    super(problem.detail);
    this.name = 'CommandError';
  }
}

const UNREACHABLE: ProblemAnswer = {
  code: 'unreachable',
  title: 'No answer from the post',
  detail: 'The post did not answer. Nothing is lost: this is sent again when you repeat it.',
};

/** Sends one command. The same id may be sent again: the post runs it once. */
export async function sendCommand<Result>(
  name: string,
  id: string,
  input: unknown,
): Promise<Result> {
  const response = await fetch(`/api/commands/${name}`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify({ id, input }),
  }).catch(() => null);
  const body: unknown = await response?.json().catch(() => null);
  if (!response || body === null) throw new CommandError(UNREACHABLE);
  if (!response.ok) throw new CommandError(body as ProblemAnswer);
  return (body as { result: Result }).result;
}

/**
 * A command as a mutation. The id is made once for each call; when the network fails it is repeated
 * with the same id, so that nothing is done twice.
 */
export function useCommand<Input, Result = unknown>(name: string) {
  return useMutation<Result, CommandError, Input>({
    mutationFn: async (input) => {
      const id = uuidv7();
      try {
        return await sendCommand<Result>(name, id, input);
      } catch (error) {
        if (!(error instanceof CommandError) || error.problem.code !== 'unreachable') throw error;
        return sendCommand<Result>(name, id, input);
      }
    },
    networkMode: 'always',
  });
}
