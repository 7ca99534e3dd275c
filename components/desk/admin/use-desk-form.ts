'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { FieldValues, Path, UseFormReturn } from 'react-hook-form';
import { CommandError, useCommand, type ProblemAnswer } from '@/components/live/use-command';

type DeskForm<Input extends FieldValues, Output> = UseFormReturn<Input, unknown, Output>;

/** How the sending of a form stands. */
export interface Sending<Output> {
  /** Sends what the form's own schema has passed. */
  send: (values: Output) => Promise<boolean>;
  pending: boolean;
  problem: ProblemAnswer | null;
  /** It was taken, and nothing was changed since. */
  saved: boolean;
}

/**
 * The attributes of a field: its registration and what is wrong with it. Spread them on an input of
 * ours.
 */
export const fieldsOf =
  <Input extends FieldValues, Output>(form: DeskForm<Input, Output>) =>
  (name: Path<Input>) => ({
    ...form.register(name),
    error: form.getFieldState(name, form.formState).error?.message,
  });

/** Puts what the post refused beside its fields. */
function showFaults<Input extends FieldValues, Output>(
  form: DeskForm<Input, Output>,
  fields: Record<string, string>,
  names: Record<string, string>,
): void {
  const known = form.getValues();
  const entries = Object.entries(fields).map(
    ([name, message]) => [names[name] ?? name, message] as const,
  );
  entries
    .filter(([name]) => name.split('.')[0]! in known)
    .forEach(([name, message], index) =>
      form.setError(name as Path<Input>, { type: 'server', message }, { shouldFocus: index === 0 }),
    );
}

interface SendOptions<Output, Result> {
  /** The input of the command, when it is not the form's own values. */
  input?: (values: Output) => unknown;
  /** Where a field of the command stands in the form, when its name is another. */
  names?: Record<string, string>;
  /** After it was taken; else the page is read anew. */
  done?: (result: Result) => void;
}

/**
 * Sends a form by `post`. A refusal stands beside its fields and above the button, and everything
 * typed stays.
 */
export function useSending<Input extends FieldValues, Output, Result>(
  form: DeskForm<Input, Output>,
  post: (input: unknown) => Promise<Result>,
  { input, names = {}, done }: SendOptions<Output, Result> = {},
): Sending<Output> {
  const router = useRouter();
  const [problem, setProblem] = useState<ProblemAnswer | null>(null);
  const [taken, setTaken] = useState(false);
  return {
    pending: form.formState.isSubmitting,
    problem,
    saved: taken && problem === null && !form.formState.isDirty,
    send: async (values) => {
      try {
        setProblem(null);
        const result = await post(input ? input(values) : values);
        form.reset(form.getValues(), { keepErrors: false });
        setTaken(true);
        if (done) done(result);
        else router.refresh();
        return true;
      } catch (error) {
        if (!(error instanceof CommandError)) throw error;
        setProblem(error.problem);
        showFaults(form, error.problem.fields ?? {}, names);
        return false;
      }
    },
  };
}

/** The same through the command of this name. */
export function useSendCommand<Input extends FieldValues, Output, Result = unknown>(
  form: DeskForm<Input, Output>,
  command: string,
  options: SendOptions<Output, Result> = {},
): Sending<Output> {
  const { mutateAsync } = useCommand<unknown, Result>(command);
  return useSending(form, mutateAsync, options);
}
