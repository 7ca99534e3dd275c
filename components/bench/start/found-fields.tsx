'use client';

import { Fieldset } from '../../ui/fieldset';
import { NumberInput } from '../../ui/number-input';
import { Select, type SelectOption } from '../../ui/select';
import { TextInput } from '../../ui/text-input';
import { fieldWords } from './field-words';
import type { StartFormApi } from './start-schema';

const BATTERY = [
  { value: '', label: 'Look and choose', disabled: true },
  { value: 'not-fitted', label: 'Has none' },
  { value: 'good', label: 'Good' },
  { value: 'low', label: 'Low' },
  { value: 'none', label: 'Missing or empty' },
];
const ZERO = [
  { value: '', label: 'Look and choose', disabled: true },
  { value: 'no-zero', label: 'Has no zero' },
  { value: 'yes', label: 'Shows zero' },
  { value: 'no', label: 'Does not' },
];

interface FoundFieldsProps {
  form: StartFormApi;
  scheme: string;
  consent: 'maximum' | 'working';
  /** 'ISO 6789:2003 sequence' */
  planName: string;
  unitLabel: string;
}

/** How the tool came in, and how much of it is pulled. */
export function FoundFields({ form, scheme, consent, planName, unitLabel }: FoundFieldsProps) {
  const { register, formState } = form;
  const error = (path: string) => fieldWords(formState.errors, path);
  const isBound = consent === 'working';
  const schemes: SelectOption[] = [
    { value: 'standard', label: planName, disabled: isBound },
    { value: 'working', label: 'Working points only' },
    { value: 'short', label: 'Short check, three pulls a point', disabled: isBound },
  ];
  return (
    <>
      <Fieldset heading legend="As found">
        <div className="grid grid-cols-2 gap-3">
          <NumberInput
            {...register('asFound.settingFound')}
            label="Setting found"
            unit={unitLabel}
            error={error('asFound.settingFound')}
          />
          <NumberInput
            {...register('asFound.temperatureC')}
            label="Ambient"
            unit="°C"
            error={error('asFound.temperatureC')}
          />
          <TextInput
            {...register('asFound.scale')}
            label="Scale checked"
            placeholder="the N·m scale"
            error={error('asFound.scale')}
          />
          <TextInput
            {...register('asFound.head')}
            label="Head or adapter"
            placeholder="ratchet head"
            error={error('asFound.head')}
          />
          <Select
            {...register('asFound.battery')}
            label="Battery"
            options={BATTERY}
            error={error('asFound.battery')}
          />
          <Select
            {...register('asFound.zeroShown')}
            label="Zero without load"
            options={ZERO}
            error={error('asFound.zeroShown')}
          />
        </div>
        <TextInput
          {...register('asFound.damage')}
          label="Damage seen"
          placeholder="none"
          error={error('asFound.damage')}
        />
      </Fieldset>
      <Select
        {...register('scheme')}
        label="What is pulled"
        hint={isBound ? 'The visitor agreed to working points only.' : undefined}
        options={schemes}
        error={error('scheme')}
      />
      {scheme === 'working' && (
        <TextInput
          {...register('workingPoints')}
          label={`Working torques, ${unitLabel}`}
          inputMode="text"
          placeholder="45, 110"
          error={error('workingPoints')}
        />
      )}
    </>
  );
}
