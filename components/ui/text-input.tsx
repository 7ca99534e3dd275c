import clsx from 'clsx';
import { useId, type ComponentProps } from 'react';
import { controlClass, controlLinks, Field, type FieldWords } from './field';

/** A labelled line of text. Other props go to the input; `id` is made when none is given. */
export function TextInput({
  label,
  hint,
  error,
  optional,
  id,
  className,
  fieldClassName,
  ...input
}: FieldWords & { fieldClassName?: string } & ComponentProps<'input'>) {
  const ownId = useId();
  const inputId = id ?? ownId;
  return (
    <Field {...{ label, hint, error, optional }} id={inputId} className={fieldClassName}>
      <input
        type="text"
        {...input}
        {...controlLinks(inputId, { hint, error })}
        className={clsx(controlClass, className)}
      />
    </Field>
  );
}

/** A labelled text of several lines. */
export function TextArea({
  label,
  hint,
  error,
  optional,
  id,
  className,
  fieldClassName,
  ...area
}: FieldWords & { fieldClassName?: string } & ComponentProps<'textarea'>) {
  const ownId = useId();
  const areaId = id ?? ownId;
  return (
    <Field {...{ label, hint, error, optional }} id={areaId} className={fieldClassName}>
      <textarea
        rows={3}
        {...area}
        {...controlLinks(areaId, { hint, error })}
        className={clsx(controlClass, className)}
      />
    </Field>
  );
}
