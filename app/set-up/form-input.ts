import { setUpFormSchema, type SetUpForm } from '@/lib/desk/set-up';
import { Problem } from '@/server/problem';

export const SET_UP_FIELDS = [
  'setupCode',
  'post.name',
  'post.shortName',
  'owner.name',
  'owner.login',
  'owner.password',
  'meet.name',
  'meet.place',
  'meet.startsOn',
  'meet.endsOn',
  'meet.timeZone',
  'meet.benches',
] as const;
export type SetUpField = (typeof SET_UP_FIELDS)[number];

/** What was typed, by field; all but the password go back into the form. */
export type SetUpValues = Record<SetUpField, string>;

export function setUpValues(form: FormData): SetUpValues {
  const text = (name: string): string => {
    const value = form.get(name);
    return typeof value === 'string' ? value.slice(0, 1000) : '';
  };
  return Object.fromEntries(SET_UP_FIELDS.map((name) => [name, text(name)])) as SetUpValues;
}

/** @throws Problem `invalid` with words for each field. */
export function setUpInput(values: SetUpValues): SetUpForm {
  const under = (part: string) =>
    Object.fromEntries(
      SET_UP_FIELDS.filter((name) => name.startsWith(`${part}.`)).map((name) => [
        name.slice(part.length + 1),
        values[name],
      ]),
    );
  const parsed = setUpFormSchema.safeParse({
    setupCode: values.setupCode,
    post: under('post'),
    owner: under('owner'),
    meet: under('meet'),
  });
  if (parsed.success) return parsed.data;
  const fields: Record<string, string> = {};
  for (const issue of parsed.error.issues) fields[issue.path.join('.')] ??= issue.message;
  throw new Problem('invalid', 'Some fields need another look.', { fields });
}
