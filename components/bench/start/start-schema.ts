import type { UseFormReturn } from 'react-hook-form';
import { z } from 'zod';
import type { BenchSnapshot } from '@/lib/live/contract';
import { startCheckSchema } from '@/lib/record/check-start';
import { toStartInput, type StartFormValues } from './form-values';

/** The start form as its parts are handed it: fields in, the command's input out. */
export type StartFormApi = UseFormReturn<
  StartFormValues,
  unknown,
  z.output<typeof startCheckSchema>
>;

/**
 * The command's own schema behind the fields of the form. The fields have the names of its input,
 * so that each complaint, here or from the post, lands beside the field that it is about.
 */
export const startFormSchema = (tool: BenchSnapshot['tool']) =>
  z
    .custom<StartFormValues>()
    .transform((values): unknown => toStartInput(values, tool))
    .pipe(
      startCheckSchema.superRefine((input, context) => {
        if (input.scheme === 'working' && (input.workingPoints ?? []).length === 0) {
          context.addIssue({
            code: 'custom',
            path: ['workingPoints'],
            message: 'Give at least one working torque, such as 45, 110.',
          });
        }
      }),
    );

/** Words for a field from the dotted paths of the post, also of what stands inside the field. */
export function wordsAt(fields: Record<string, string>, path: string): string | undefined {
  return Object.entries(fields).find(([key]) => key === path || key.startsWith(`${path}.`))?.[1];
}
