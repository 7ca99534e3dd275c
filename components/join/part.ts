import type { JoinField, JoinState } from './fields';

/** What every part of the form is handed. */
export type PartProps = Pick<JoinState, 'values' | 'errors'>;

/** Name, id, first value and error of a field, for its control. */
export const fieldProps = ({ values, errors }: PartProps, field: JoinField) => ({
  id: field,
  name: field,
  defaultValue: values[field],
  error: errors[field],
});

/** Is something wrong in one of these fields? */
export const hasError = ({ errors }: PartProps, fields: readonly JoinField[]): boolean =>
  fields.some((field) => errors[field] !== undefined);

/** Is there anything typed or wrong in these fields? Then their fold stands open. */
export const isTouched = (part: PartProps, fields: readonly JoinField[]): boolean =>
  hasError(part, fields) || fields.some((field) => part.values[field] !== '');
