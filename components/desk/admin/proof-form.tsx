'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import type { z } from 'zod';
import {
  errorWords,
  PROOF_METHOD_WORDS,
  proofOutcome,
  proofSchema,
  type ProofInput,
} from '@/lib/desk/proof';
import { parseDecimal } from '@/lib/line/join';
import { PROOF_METHODS } from '@/lib/line/states';
import { TORQUE_UNITS, unitText } from '@/lib/torque/units';
import { Checkbox } from '@/components/ui/checkbox';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextArea } from '@/components/ui/text-input';
import { FormFoot } from './form-foot';
import { fieldsOf, useSendCommand } from './use-desk-form';

const METHODS = PROOF_METHODS.map((method) => ({
  value: method,
  label: PROOF_METHOD_WORDS[method],
}));
const UNITS = TORQUE_UNITS.map((unit) => ({ value: unit, label: unitText(unit) }));

const typedNumber = (value: unknown): number | null =>
  typeof value === 'number' ? value : typeof value === 'string' ? parseDecimal(value) : null;

/** What load and reading come to, before it is sent; null while they are incomplete. */
function outcomeOf(values: readonly unknown[]) {
  const [load, reading, limitPercent] = values.map(typedNumber);
  if (load == null || reading == null || limitPercent == null) return null;
  if (!(load > 0) || !(reading >= 0) || !(limitPercent > 0)) return null;
  return proofOutcome({ load, reading, limitPercent });
}

/** Enters a proof. Whether it passed is worked out as it is typed. */
export function ProofForm({ testerId, locked }: { testerId: string; locked: boolean }) {
  const blank: ProofInput = {
    testerId,
    method: 'dead-weight',
    load: '',
    reading: '',
    unit: 'N.m',
    limitPercent: '0.5',
    note: '',
    sure: false,
  };
  const form = useForm<ProofInput, unknown, z.output<typeof proofSchema>>({
    resolver: zodResolver(proofSchema),
    defaultValues: blank,
  });
  const sending = useSendCommand(form, 'proof.add');
  const field = fieldsOf(form);
  const outcome = outcomeOf(
    useWatch({ control: form.control, name: ['load', 'reading', 'limitPercent'] }),
  );
  const submit = form.handleSubmit(async (values) => {
    if (await sending.send(values))
      form.reset({ ...blank, method: values.method, unit: values.unit });
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="flex flex-col gap-5">
      <Select label="How" options={METHODS} {...field('method')} />
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <NumberInput label="Load" {...field('load')} />
        <Select label="Unit" options={UNITS} {...field('unit')} />
        <NumberInput label="The tester showed" {...field('reading')} />
        <NumberInput label="Limit" unit="± %" {...field('limitPercent')} />
      </div>
      <TextArea label="Note" optional rows={2} {...field('note')} />
      <p role="status" className="font-semibold">
        {outcome === null
          ? ''
          : outcome.result === 'passed'
            ? `${errorWords(outcome.errorPercent)} of the load: passed.${locked ? ' It lifts the lock.' : ''}`
            : `${errorWords(outcome.errorPercent)} of the load: failed. It locks the tester.`}
      </p>
      {outcome?.farOff && (
        <Checkbox
          label="I have looked again: load, reading and unit are right."
          {...field('sure')}
        />
      )}
      <FormFoot
        sending={sending}
        label="Enter the proof"
        savedWords="Entered. A proof cannot be changed."
      />
    </form>
  );
}
