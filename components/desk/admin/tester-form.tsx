'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { testerSchema, type TesterDescription, type TesterInput } from '@/lib/desk/tester';
import { TORQUE_UNITS, unitText } from '@/lib/torque/units';
import { Checkbox } from '@/components/ui/checkbox';
import { Fieldset } from '@/components/ui/fieldset';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { ConnectionFields } from './connection-fields';
import { FormFoot } from './form-foot';
import type { TesterValues } from './tester-values';
import { fieldsOf, useSendCommand } from './use-desk-form';

const UNIT_OPTIONS = TORQUE_UNITS.map((unit) => ({ value: unit, label: unitText(unit) }));

/** The form holds the fields of every connection; the schema takes those of the chosen one. */
const formSchema = z
  .custom<TesterValues>()
  .transform((values): TesterInput => values)
  .pipe(testerSchema);

interface TesterFormProps {
  /** null for a new one. */
  testerId: string | null;
  defaults: TesterValues;
}

/** Adds a tester, or changes one. */
export function TesterForm({ testerId, defaults }: TesterFormProps) {
  const router = useRouter();
  const form = useForm<TesterValues, unknown, TesterDescription>({
    resolver: zodResolver(formSchema),
    defaultValues: defaults,
  });
  const sending = useSendCommand<TesterValues, TesterDescription, { testerId: string }>(
    form,
    testerId === null ? 'tester.add' : 'tester.change',
    {
      input: (tester) => (testerId === null ? tester : { testerId, tester }),
      done: (result) => router.push(`/desk/testers/${result.testerId}`),
    },
  );
  const field = fieldsOf(form);
  return (
    <form
      method="post"
      onSubmit={form.handleSubmit(sending.send)}
      noValidate
      className="flex max-w-[52rem] flex-col gap-8"
    >
      <Fieldset legend="Plate" heading>
        <div className="grid items-start gap-4 sm:grid-cols-2">
          <TextInput label="Name on the bench" hint="Short, such as T-01." {...field('name')} />
          <TextInput label="Serial number" hint="As on its plate." {...field('serial')} />
          <TextInput label="Maker" {...field('maker')} />
          <TextInput label="Model" {...field('model')} />
        </div>
      </Fieldset>
      <Fieldset
        legend="Range"
        hint="No tool is pulled above it. It cannot be changed while a check runs."
        heading
      >
        <div className="grid items-start gap-4 sm:grid-cols-4">
          <NumberInput label="Lowest" {...field('min')} />
          <NumberInput label="Highest" {...field('max')} />
          <NumberInput label="Resolution" {...field('resolution')} />
          <Select label="Unit" options={UNIT_OPTIONS} {...field('unit')} />
        </div>
      </Fieldset>
      <Fieldset legend="Uncertainty" heading>
        <div className="grid items-start gap-4 sm:grid-cols-2">
          <NumberInput
            label="Drift limit in a year"
            hint="Largest drift to allow for, of reading."
            unit="± %"
            {...field('yearlyDriftPercent')}
          />
          <NumberInput
            label="Temperature coefficient"
            optional
            hint="Of reading, from that of the certificate."
            unit="% / K"
            {...field('temperatureCoefficientPercentPerK')}
          />
        </div>
        <Checkbox
          label="Take the certificate’s error off each reading"
          hint="Whether it is taken off stands on every record."
          {...field('correctionApplied')}
        />
      </Fieldset>
      <ConnectionFields form={form} />
      <FormFoot
        sending={sending}
        label={testerId === null ? 'Add the tester' : 'Save the tester'}
      />
    </form>
  );
}
