import clsx from 'clsx';
import { useId, type ComponentProps, type ReactNode } from 'react';
import { controlClass, controlLinks, Field, type FieldWords } from './field';

interface NumberInputProps
  extends FieldWords, Omit<ComponentProps<'input'>, 'type' | 'inputMode' | 'size'> {
  /** Unit shown behind the number, such as `N·m`; the label says it too or is clear without. */
  unit?: ReactNode;
  /** `big` for the bench: gloves on, read from a step away. */
  size?: 'normal' | 'big';
  fieldClassName?: string;
}

/**
 * A labelled number with a decimal keypad. A text input on purpose: a number input swallows a
 * decimal comma, changes under the mouse wheel and hides what it could not read.
 */
export function NumberInput({
  label,
  hint,
  error,
  optional,
  id,
  unit,
  size = 'normal',
  className,
  fieldClassName,
  ...input
}: NumberInputProps) {
  const ownId = useId();
  const inputId = id ?? ownId;
  return (
    <Field {...{ label, hint, error, optional }} id={inputId} className={fieldClassName}>
      <span className="flex items-center gap-2.5">
        <input
          autoComplete="off"
          {...input}
          {...controlLinks(inputId, { hint, error })}
          type="text"
          inputMode="decimal"
          className={clsx(
            controlClass,
            'font-reading',
            size === 'big' && 'min-h-20 text-5xl font-bold',
            className,
          )}
        />
        {unit !== undefined && (
          <span className={clsx('shrink-0', size === 'big' && 'font-code text-4xl font-semibold')}>
            {unit}
          </span>
        )}
      </span>
    </Field>
  );
}
