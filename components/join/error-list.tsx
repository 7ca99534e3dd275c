import type { Ref } from 'react';
import { WarningShape } from '@/components/ui/warning-shape';
import { JOIN_LABELS, type JoinField, type JoinState } from './fields';

interface ErrorListProps extends Pick<JoinState, 'errors' | 'message'> {
  ref: Ref<HTMLDivElement>;
}

/** Everything that is wrong with the form, at its top, with a way to each field. */
export function ErrorList({ ref, errors, message }: ErrorListProps) {
  const fields = Object.entries(errors) as [JoinField, string][];
  if (fields.length === 0 && message === null) return null;
  return (
    <div
      ref={ref}
      tabIndex={-1}
      role="alert"
      className="bg-band text-ink border-ink outline-ink flex gap-3 border-l-6 px-4 py-3 outline-2 -outline-offset-2"
    >
      <WarningShape className="mt-0.5 size-6 shrink-0" />
      <div className="flex min-w-0 flex-1 flex-col gap-1">
        <p className="font-bold">{message ?? 'Something needs another look.'}</p>
        {fields.length > 0 && (
          <ul className="flex flex-col">
            {fields.map(([field, words]) => (
              <li key={field}>
                <a href={`#${field}`} className="inline-block py-1.5 underline underline-offset-4">
                  {JOIN_LABELS[field]}: {words}
                </a>
              </li>
            ))}
          </ul>
        )}
      </div>
    </div>
  );
}
