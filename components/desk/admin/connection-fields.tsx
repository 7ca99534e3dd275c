'use client';

import { useState } from 'react';
import { useWatch, type UseFormReturn } from 'react-hook-form';
import type { TesterDescription } from '@/lib/desk/tester';
import { BAUD_RATES } from '@/lib/signal/connection';
import { parseTesterLine } from '@/lib/signal/line';
import { linePatternFault } from '@/lib/signal/pattern';
import { formatTorque, TORQUE_UNITS, unitText, type TorqueUnit } from '@/lib/torque/units';
import { Fieldset } from '@/components/ui/fieldset';
import { NumberInput } from '@/components/ui/number-input';
import { RadioCards } from '@/components/ui/radio-cards';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import type { TesterValues } from './tester-values';
import { fieldsOf } from './use-desk-form';

const KINDS = [
  { value: 'keyed', label: 'Typed', hint: 'The operator reads the tester and types.' },
  { value: 'serial', label: 'Serial line', hint: 'The tester sends one line a pull.' },
  {
    value: 'simulated',
    label: 'Simulated',
    hint: 'Made-up pulls, to practise. Never for real tools.',
  },
];

/** How readings come from a tester. */
export function ConnectionFields({
  form,
}: {
  form: UseFormReturn<TesterValues, unknown, TesterDescription>;
}) {
  const field = fieldsOf(form);
  const kind = useWatch({ control: form.control, name: 'connection.kind' });
  return (
    <Fieldset legend="Connection" heading>
      <RadioCards
        legend="Readings come"
        options={KINDS}
        columns={3}
        value={kind}
        {...field('connection.kind')}
      />
      {kind === 'serial' && <SerialFields form={form} />}
      {kind === 'simulated' && (
        <div className="grid items-start gap-4 sm:grid-cols-4">
          <NumberInput label="Bias" unit="%" {...field('connection.biasPercent')} />
          <NumberInput label="Scatter" unit="%" {...field('connection.scatterPercent')} />
          <NumberInput label="Time a pull" unit="s" {...field('connection.secondsPerPull')} />
          <NumberInput label="Seed" {...field('connection.seed')} />
        </div>
      )}
    </Fieldset>
  );
}

function SerialFields({ form }: { form: UseFormReturn<TesterValues, unknown, TesterDescription> }) {
  const field = fieldsOf(form);
  const [linePattern, unit] = useWatch({
    control: form.control,
    name: ['connection.linePattern', 'connection.unit'],
  });
  return (
    <>
      <div className="grid items-start gap-4 sm:grid-cols-3">
        <TextInput
          label="Port"
          hint="Such as /dev/ttyUSB0 or COM3."
          spellCheck={false}
          {...field('connection.path')}
        />
        <Select
          label="Baud rate"
          hint="Bits a second."
          options={BAUD_RATES.map((rate) => ({ value: String(rate), label: String(rate) }))}
          {...field('connection.baudRate')}
        />
        <Select
          label="Unit"
          hint="Of lines that name none."
          options={TORQUE_UNITS.map((one) => ({ value: one, label: unitText(one) }))}
          {...field('connection.unit')}
        />
      </div>
      <TextInput
        label="Line pattern"
        hint="A regular expression with a group named value, and if you like sign and unit. The one given fits most testers."
        spellCheck={false}
        className="font-reading"
        {...field('connection.linePattern')}
      />
      <TryLine pattern={linePattern} unit={unit} />
    </>
  );
}

/** Shows how a line of the tester would be read. */
function TryLine({ pattern, unit }: { pattern: string; unit: TorqueUnit }) {
  const [line, setLine] = useState('');
  return (
    <div className="flex flex-col gap-2">
      <TextInput
        label="Try a line"
        optional
        hint="Type one as your tester sends it. It is not saved."
        spellCheck={false}
        className="font-reading"
        value={line}
        onChange={(event) => setLine(event.target.value)}
      />
      <p role="status">{line.trim() === '' ? '' : readWords(line, pattern, unit)}</p>
    </div>
  );
}

function readWords(line: string, pattern: string, unit: TorqueUnit): string {
  const fault = linePatternFault(pattern);
  if (fault) return fault;
  const read = parseTesterLine(line, { pattern, unit });
  if (!read.ok) return `Not a reading: ${read.reason}.`;
  const way =
    read.direction === null ? '' : read.direction === 'cw' ? ', clockwise' : ', counter-clockwise';
  return `Read as ${formatTorque(read.valueNm, 'N.m')}${way}.`;
}
