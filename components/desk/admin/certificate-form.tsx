'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useForm, useWatch } from 'react-hook-form';
import type { z } from 'zod';
import { certificateSchema } from '@/lib/desk/certificate';
import { parsePoints } from '@/lib/desk/certificate-points';
import { TORQUE_UNITS, unitText } from '@/lib/torque/units';
import { Fieldset } from '@/components/ui/fieldset';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextArea, TextInput } from '@/components/ui/text-input';
import { FormFoot } from './form-foot';
import { PointsTable } from './points-table';
import { fieldsOf, useSendCommand } from './use-desk-form';

type Output = z.output<typeof certificateSchema>;
type Values = z.input<typeof certificateSchema>;

const UNITS = TORQUE_UNITS.map((unit) => ({ value: unit, label: unitText(unit) }));

/** Enters a certificate from paper. */
export function CertificateForm({ testerId }: { testerId: string }) {
  const router = useRouter();
  const form = useForm<Values, unknown, Output>({
    resolver: zodResolver(certificateSchema),
    defaultValues: {
      testerId,
      number: '',
      laboratory: '',
      accreditation: '',
      issuedOn: '',
      dueOn: '',
      traceability: '',
      temperatureC: '',
      unit: 'N.m',
      points: '',
    },
  });
  const sending = useSendCommand(form, 'certificate.add', {
    done: () => router.push(`/desk/testers/${testerId}`),
  });
  const field = fieldsOf(form);
  const [typed, unit] = useWatch({ control: form.control, name: ['points', 'unit'] });
  const points = typeof typed === 'string' ? typed : '';
  const parsed = parsePoints(points);
  return (
    <form
      method="post"
      onSubmit={form.handleSubmit(sending.send)}
      noValidate
      className="flex flex-col gap-8"
    >
      <Fieldset legend="Paper" heading>
        <div className="grid items-start gap-4 sm:grid-cols-2 lg:grid-cols-3">
          <TextInput label="Number" {...field('number')} />
          <TextInput label="Laboratory" {...field('laboratory')} />
          <TextInput label="Accreditation" {...field('accreditation')} />
          <TextInput label="Issued on" type="date" {...field('issuedOn')} />
          <TextInput label="Due on" type="date" {...field('dueOn')} />
          <NumberInput label="Temperature" optional unit="°C" {...field('temperatureC')} />
        </div>
        <TextInput
          label="Traceability"
          hint="In the certificate’s own words."
          {...field('traceability')}
        />
      </Fieldset>
      <Fieldset legend="Points" heading>
        <div className="grid items-start gap-6 lg:grid-cols-2">
          <div className="flex flex-col gap-4">
            <Select label="Unit of the torques" options={UNITS} {...field('unit')} />
            <TextArea
              label="Points"
              hint="A row a point: direction (cw or ccw), torque, error %, expanded uncertainty %, k. Paste from a sheet, or type with blanks between."
              rows={12}
              spellCheck={false}
              className="font-reading"
              placeholder={'cw 10 0.12 0.30 2\ncw 50 0.08 0.25 2'}
              {...field('points')}
            />
          </div>
          <div>
            <p className="mb-2 font-semibold">Understood as</p>
            {'points' in parsed ? (
              <PointsTable
                caption="Points as they are understood"
                points={parsed.points}
                unit={unit}
              />
            ) : (
              <p className="text-fore-quiet">
                {points.trim() === '' ? 'Nothing yet.' : parsed.fault}
              </p>
            )}
            <p className="text-fore-quiet mt-3">
              Error: above zero when the tester shows more than is true.
            </p>
          </div>
        </div>
      </Fieldset>
      <FormFoot sending={sending} label="Enter the certificate" />
    </form>
  );
}
