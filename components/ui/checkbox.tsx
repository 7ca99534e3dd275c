import clsx from 'clsx';
import { useId, type ComponentProps } from 'react';
import { controlLinks, type FieldWords } from './field';
import { FieldError } from './field-error';

/** A box to tick, with the whole line as its target. */
export function Checkbox({
  label,
  hint,
  error,
  id,
  className,
  ...input
}: Omit<FieldWords, 'optional'> & Omit<ComponentProps<'input'>, 'type'>) {
  const ownId = useId();
  const boxId = id ?? ownId;
  return (
    <div className={clsx('flex flex-col gap-1', className)}>
      <label htmlFor={boxId} className="flex min-h-12 items-center gap-3 py-1.5">
        <input
          {...input}
          {...controlLinks(boxId, { hint, error })}
          type="checkbox"
          className="accent-ink size-6.5 shrink-0"
        />
        <span className="leading-snug">{label}</span>
      </label>
      {hint && (
        <p id={`${boxId}-hint`} className="text-fore-quiet -mt-2 pl-9.5">
          {hint}
        </p>
      )}
      <FieldError id={`${boxId}-error`} error={error} />
    </div>
  );
}
