import clsx from 'clsx';
import { useId, type ComponentProps } from 'react';
import { controlClass, controlLinks, Field, type FieldWords } from './field';

export interface SelectOption {
  value: string;
  label: string;
  disabled?: boolean;
}

interface SelectProps extends FieldWords, Omit<ComponentProps<'select'>, 'children'> {
  options: readonly SelectOption[];
  /** An empty first choice with these words; it has the value ''. */
  placeholder?: string;
  fieldClassName?: string;
}

/** A labelled native select. */
export function Select({
  label,
  hint,
  error,
  optional,
  id,
  options,
  placeholder,
  className,
  fieldClassName,
  ...select
}: SelectProps) {
  const ownId = useId();
  const selectId = id ?? ownId;
  return (
    <Field {...{ label, hint, error, optional }} id={selectId} className={fieldClassName}>
      <select
        {...select}
        {...controlLinks(selectId, { hint, error })}
        className={clsx(controlClass, className)}
      >
        {placeholder !== undefined && <option value="">{placeholder}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.disabled}>
            {option.label}
          </option>
        ))}
      </select>
    </Field>
  );
}
