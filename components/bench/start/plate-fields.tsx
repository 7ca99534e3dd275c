'use client';

import { CLAIM_KINDS } from '@/lib/torque/claim';
import { isFixedTool, TOOL_CLASSES } from '@/lib/torque/tool';
import { TORQUE_UNITS, unitText } from '@/lib/torque/units';
import { toolKindWords } from '@/lib/torque/words';
import { Checkbox } from '../../ui/checkbox';
import { Fieldset } from '../../ui/fieldset';
import { NumberInput } from '../../ui/number-input';
import { Select } from '../../ui/select';
import { TextInput } from '../../ui/text-input';
import { fieldWords } from './field-words';
import { testerModeOf, toolClassOf } from './form-values';
import type { StartFormApi } from './start-schema';

const KINDS = TOOL_CLASSES.map((toolClass) => ({
  value: toolClass,
  label: `${toolKindWords(toolClass)}${toolClass === 'I-C' ? ' or adapter' : ''} (${toolClass})`,
}));
const UNITS = TORQUE_UNITS.map((unit) => ({ value: unit, label: unitText(unit) }));
const CLAIM_WORDS = { reading: 'reading', 'full-scale': 'full scale' };
const CLAIMS = CLAIM_KINDS.map((kind) => ({ value: kind, label: CLAIM_WORDS[kind] }));

interface PlateFieldsProps {
  form: StartFormApi;
  toolClass: string;
}

/** What the tool's plate says. It replaces what the visitor said. */
export function PlateFields({ form, toolClass }: PlateFieldsProps) {
  const { register, formState, getValues, setValue } = form;
  const error = (path: string) => fieldWords(formState.errors, path);
  const known = toolClassOf(toolClass);
  const kind = register('tool.toolClass', {
    onChange: (event: { target: { value: string } }) => {
      // A confirmed mode is the mode of the class before.
      if (testerModeOf(event.target.value) !== testerModeOf(toolClass)) {
        setValue('testerModeConfirmed', false);
      }
    },
  });
  return (
    <Fieldset heading legend="What its plate says" className="gap-2">
      <Select
        {...kind}
        label="Kind and class"
        placeholder="Choose the kind"
        options={KINDS}
        error={error('tool.toolClass')}
      />
      <div className="grid grid-cols-[1fr_1fr_7.5rem] gap-3">
        <NumberInput {...register('tool.rangeMin')} label="From" error={error('tool.rangeMin')} />
        <NumberInput {...register('tool.rangeMax')} label="To" error={error('tool.rangeMax')} />
        <Select
          {...register('tool.unit')}
          label="Unit"
          options={UNITS}
          error={error('tool.unit')}
        />
      </div>
      {known && isFixedTool(known) && (
        <NumberInput
          {...register('tool.nominal')}
          label="Preset value"
          error={error('tool.nominal')}
        />
      )}
      <div className="grid grid-cols-[1fr_1fr_1fr_8rem] gap-3">
        <NumberInput
          {...register('tool.division')}
          label="Division"
          error={error('tool.division')}
        />
        <NumberInput
          {...register('tool.claim.cwPercent')}
          label="Claim ±%"
          error={error('tool.claim.cwPercent')}
        />
        <NumberInput
          {...register('tool.claim.ccwPercent')}
          label="ccw ±%"
          error={error('tool.claim.ccwPercent')}
        />
        <Select
          {...register('tool.claim.of')}
          label="of its"
          options={CLAIMS}
          error={error('tool.claim.of')}
        />
      </div>
      <Checkbox
        {...register('tool.measuresCcw')}
        label="Owner or plate: also counter-clockwise"
        defaultChecked={getValues('tool.measuresCcw')}
      />
      <div className="grid grid-cols-3 gap-3">
        <TextInput {...register('tool.drive')} label="Drive" error={error('tool.drive')} />
        <TextInput {...register('tool.maker')} label="Maker" error={error('tool.maker')} />
        <TextInput {...register('tool.serial')} label="Serial" error={error('tool.serial')} />
      </div>
    </Fieldset>
  );
}
