import { WarningShape } from './warning-shape';

/** A field's error: a triangle and bold words in ink, tied to the control by `id`. */
export function FieldError({ id, error }: { id: string; error: string | undefined }) {
  if (!error) return null;
  return (
    <p id={id} className="flex items-start gap-2 font-bold">
      <WarningShape className="mt-0.5 size-5 shrink-0" />
      {error}
    </p>
  );
}
