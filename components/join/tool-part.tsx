import clsx from 'clsx';
import { Disclosure } from '@/components/ui/disclosure';
import { Fieldset } from '@/components/ui/fieldset';
import { NumberInput } from '@/components/ui/number-input';
import { RadioCards, type RadioCardOption } from '@/components/ui/radio-cards';
import { Select, type SelectOption } from '@/components/ui/select';
import styles from './join.module.css';
import { fieldProps, hasError, type PartProps } from './part';

interface ToolPartProps extends PartProps {
  kinds: { common: RadioCardOption[]; more: RadioCardOption[] };
  units: SelectOption[];
}

/** What kind of tool it is, and from where to where it goes. */
export function ToolPart({ kinds, units, ...part }: ToolPartProps) {
  const kind = part.values.kind;
  const isWrong = hasError(part, ['rangeMin', 'rangeMax', 'nominal', 'unit']);
  const isRare = kinds.more.some((option) => option.value === kind);
  return (
    <>
      <div id="kind" tabIndex={-1} className="flex flex-col">
        <RadioCards
          legend="What kind of tool is it?"
          name="kind"
          options={kinds.common}
          defaultValue={kind}
          error={part.errors.kind}
          required
        />
        <Disclosure summary="More kinds, or not sure" open={isRare || undefined}>
          <RadioCards
            legend="More kinds"
            name="kind"
            options={kinds.more}
            defaultValue={kind}
            required
          />
        </Disclosure>
      </div>
      <Fieldset legend="What does its scale say?">
        {/* With something wrong each has a line of its own: words need the room. */}
        <div
          className={clsx(
            'grid items-start gap-2.5',
            isWrong ? 'grid-cols-1' : 'grid-cols-[1fr_1fr_1.3fr]',
          )}
        >
          <NumberInput
            label="From"
            {...fieldProps(part, 'rangeMin')}
            fieldClassName={styles.whenRange}
          />
          <NumberInput
            label="To"
            {...fieldProps(part, 'rangeMax')}
            fieldClassName={styles.whenRange}
          />
          <NumberInput
            label="Preset value"
            {...fieldProps(part, 'nominal')}
            fieldClassName={clsx(styles.whenPreset, !isWrong && 'col-span-2')}
          />
          <Select
            label="Unit"
            placeholder="Pick"
            options={units}
            required
            {...fieldProps(part, 'unit')}
          />
        </div>
      </Fieldset>
    </>
  );
}
