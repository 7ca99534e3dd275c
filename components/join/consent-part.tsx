import { RadioCards } from '@/components/ui/radio-cards';
import { TextInput } from '@/components/ui/text-input';
import styles from './join.module.css';
import { fieldProps, type PartProps } from './part';

const options = [
  {
    value: 'maximum',
    label: 'Up to its maximum',
    hint: 'The full check. It is pulled up to its maximum several times, at its owner’s risk; I agree.',
  },
  {
    value: 'working',
    label: 'At my working torques only',
    hint: 'Nothing is said about the rest of its range.',
  },
];

/** The visitor's leave to pull the tool. Neither choice is made for them. */
export function ConsentPart(part: PartProps) {
  return (
    <div id="consent" tabIndex={-1} className="flex flex-col gap-4">
      <RadioCards
        legend="How may we pull it?"
        name="consent"
        options={options}
        defaultValue={part.values.consent}
        error={part.errors.consent}
        required
      />
      <TextInput
        label="Working torques"
        hint="For working torques only: up to six, such as 45 110"
        autoComplete="off"
        {...fieldProps(part, 'workingPoints')}
        fieldClassName={styles.whenWorking ?? ''}
      />
    </div>
  );
}
