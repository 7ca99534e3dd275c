'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import { GUARDS, MEET_SCHEMES, planSchema, type PlanInput } from '@/lib/desk/plan';
import { schemeFacts } from '@/lib/torque/schemes';
import type { PlanSettings } from '@/lib/torque/settings';
import type { z } from 'zod';
import { Fieldset } from '@/components/ui/fieldset';
import { NumberInput } from '@/components/ui/number-input';
import { RadioCards } from '@/components/ui/radio-cards';
import { FormFoot } from './form-foot';
import { fieldsOf, useSendCommand } from './use-desk-form';

const SCHEME_HINTS: Record<(typeof MEET_SCHEMES)[number], string> = {
  'iso-2003': 'Five exercise pulls for setting tools, five readings at 20, 60 and 100 %.',
  'iso-2017': 'The same pulls, with the newer edition’s times for each pull.',
  short: 'Three exercise pulls and three readings a point. The record says that it was short.',
};

const schemeOptions = MEET_SCHEMES.map((scheme) => ({
  value: scheme,
  label: schemeFacts(scheme).name,
  hint: SCHEME_HINTS[scheme],
}));

const basisOptions = [
  {
    value: 'reference',
    label: 'Relative to what the tester measured',
    hint: 'As in ISO 6789: by how much the tool says more than it delivers.',
  },
  {
    value: 'set',
    label: 'Relative to what the tool says',
    hint: 'By how much the tool delivers more than it says.',
  },
];

const guardOptions = GUARDS.map(({ value, label, source }) => ({
  value: String(value),
  label,
  hint: source,
}));

/** How the tools of a meet are checked from now on. */
export function PlanForm({ meetId, plan }: { meetId: string; plan: PlanSettings }) {
  const form = useForm<PlanInput, unknown, z.output<typeof planSchema>>({
    resolver: zodResolver(planSchema),
    defaultValues: {
      meetId,
      scheme: plan.scheme,
      basis: plan.basis,
      guard: String(plan.guard),
      exercisePulls: plan.overrides.exercisePulls ?? '',
      readingsPerPoint: plan.overrides.readingsPerPoint ?? '',
    },
  });
  const sending = useSendCommand(form, 'plan.change');
  const field = fieldsOf(form);
  const [scheme, basis, guard] = useWatch({
    control: form.control,
    name: ['scheme', 'basis', 'guard'],
  });
  return (
    <form
      method="post"
      onSubmit={form.handleSubmit(sending.send)}
      noValidate
      className="flex flex-col gap-8"
    >
      <RadioCards
        legend="Sequence of pulls"
        options={schemeOptions}
        value={scheme}
        {...field('scheme')}
      />
      <RadioCards
        legend="Basis of the deviation"
        options={basisOptions}
        value={basis}
        {...field('basis')}
      />
      <RadioCards
        legend="Guard band"
        hint="How much of the uncertainty is taken off the tolerance before a tool passes as within."
        options={guardOptions}
        value={String(guard)}
        {...field('guard')}
      />
      <Fieldset
        legend="Other numbers than the sequence’s"
        hint="Leave them empty to follow the sequence. A changed number stands on every record."
      >
        <div className="grid items-start gap-4 sm:grid-cols-2">
          <NumberInput label="Exercise pulls" optional {...field('exercisePulls')} />
          <NumberInput label="Readings a point" optional {...field('readingsPerPoint')} />
        </div>
      </Fieldset>
      <FormFoot
        sending={sending}
        label="Save the plan"
        savedWords="Saved. It holds for checks that begin from now on."
      />
    </form>
  );
}
