import { get, type FieldErrors } from 'react-hook-form';
import type { StartFormValues } from './form-values';

function firstMessage(node: unknown): string | undefined {
  if (typeof node !== 'object' || node === null) return undefined;
  if ('message' in node && typeof node.message === 'string') return node.message;
  // A list's own field holds one complaint for each of its items.
  return Array.isArray(node)
    ? node.map(firstMessage).find((words) => words !== undefined)
    : undefined;
}

/** What is wrong with a field, in words; undefined when nothing is. */
export const fieldWords = (
  errors: FieldErrors<StartFormValues>,
  path: string,
): string | undefined => firstMessage(get(errors, path));
