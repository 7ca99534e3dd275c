import { buttonClass } from '@/components/ui/button';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';

/** In place of a meet: what belongs to none, such as testers, accounts and sign-ins. */
export const WHOLE_POST = '-post';

interface AuditFilterProps {
  meets: { slug: string; name: string }[];
  chosen: string;
  tag: string;
  error: string | undefined;
}

/** Which part of the ledger to read: a plain form. */
export function AuditFilter({ meets, chosen, tag, error }: AuditFilterProps) {
  return (
    <form action="/desk/audit" className="flex flex-wrap items-end gap-x-4 gap-y-2">
      <Select
        label="Of"
        name="meet"
        defaultValue={chosen}
        fieldClassName="w-80 max-w-full"
        options={[
          ...meets.map(({ slug, name }) => ({ value: slug, label: name })),
          { value: WHOLE_POST, label: 'The post: testers, accounts, sign-ins' },
        ]}
      />
      <TextInput
        label="Tag"
        name="tag"
        optional
        defaultValue={tag}
        error={error}
        placeholder="A27"
        autoComplete="off"
        fieldClassName="w-40"
      />
      <button type="submit" className={buttonClass({ variant: 'secondary' })}>
        Show
      </button>
    </form>
  );
}
