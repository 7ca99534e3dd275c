import { Checkbox } from '@/components/ui/checkbox';
import { Disclosure } from '@/components/ui/disclosure';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import type { JoinField } from './fields';
import styles from './join.module.css';
import { fieldProps, isTouched, type PartProps } from './part';

const FIELDS: JoinField[] = [
  'drive',
  'claimPercent',
  'claimCcwPercent',
  'ownPoints',
  'measuresCcw',
  'division',
  'maker',
  'serial',
];

const claimKinds = [
  { value: 'reading', label: 'of the reading' },
  { value: 'full-scale', label: 'of full scale' },
];

/** What helps at the bench and can wait until then. */
export function MorePart(part: PartProps) {
  return (
    <Disclosure
      summary={
        <span>
          More about the tool <span className="text-fore-quiet font-normal">(optional)</span>
        </span>
      }
      open={isTouched(part, FIELDS) || undefined}
    >
      <p className="text-fore-quiet">What you leave out, we read off the tool together.</p>
      <TextInput
        label="Drive size"
        hint="Such as 1/2 in"
        autoComplete="off"
        {...fieldProps(part, 'drive')}
      />
      <div className="grid grid-cols-2 items-end gap-2.5">
        <NumberInput label="Maker’s claim, ±" unit="%" {...fieldProps(part, 'claimPercent')} />
        <Select
          label="Per cent of what"
          options={claimKinds}
          {...fieldProps(part, 'claimOf')}
          defaultValue={part.values.claimOf || 'reading'}
        />
      </div>
      <Checkbox
        label="It also measures counter-clockwise"
        hint="A reversible ratchet does not prove it: look at the plate or the manual."
        id="measuresCcw"
        name="measuresCcw"
        defaultChecked={part.values.measuresCcw === 'on'}
      />
      <NumberInput
        label="Claim counter-clockwise, ±"
        hint="Only where the maker states one"
        unit="%"
        {...fieldProps(part, 'claimCcwPercent')}
      />
      <TextInput
        label="Torques you work with"
        hint="Up to six, such as 45 110"
        autoComplete="off"
        {...fieldProps(part, 'ownPoints')}
        fieldClassName={styles.whenNotWorking ?? ''}
      />
      <NumberInput
        label="Scale division or display step"
        hint="In the unit of the scale"
        {...fieldProps(part, 'division')}
        fieldClassName={styles.whenRange}
      />
      <TextInput label="Maker" autoComplete="off" {...fieldProps(part, 'maker')} />
      <TextInput label="Serial number" autoComplete="off" {...fieldProps(part, 'serial')} />
    </Disclosure>
  );
}
