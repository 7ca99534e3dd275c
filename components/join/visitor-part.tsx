import { Disclosure } from '@/components/ui/disclosure';
import { TextInput } from '@/components/ui/text-input';
import type { JoinField } from './fields';
import { fieldProps, isTouched, type PartProps } from './part';

const FIELDS: JoinField[] = ['name', 'email', 'mobile'];

/** Who the visitor is, if they want to say. */
export function VisitorPart(part: PartProps) {
  return (
    <Disclosure
      className="border-line border-t"
      summary={
        <span>
          About you <span className="text-fore-quiet font-normal">(optional)</span>
        </span>
      }
      open={isTouched(part, FIELDS) || undefined}
    >
      <p className="text-fore-quiet">
        For the staff here to know whose tool it is and to reach you about it. Never shown on the
        board or on the record.
      </p>
      <TextInput label="Name" autoComplete="name" {...fieldProps(part, 'name')} />
      <TextInput label="Mail" type="email" autoComplete="email" {...fieldProps(part, 'email')} />
      <TextInput label="Mobile" type="tel" autoComplete="tel" {...fieldProps(part, 'mobile')} />
    </Disclosure>
  );
}
