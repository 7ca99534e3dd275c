'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useMemo, type KeyboardEvent } from 'react';
import { useForm, useWatch, type FieldPath } from 'react-hook-form';
import type { z } from 'zod';
import type { BenchSnapshot, TagView } from '@/lib/live/contract';
import { toolSchema } from '@/lib/line/join';
import type { startCheckSchema } from '@/lib/record/check-start';
import { schemeFacts } from '@/lib/torque/schemes';
import { TORQUE_UNITS, unitText } from '@/lib/torque/units';
import { useSteadyCommand } from '../use-steady-command';
import { useBench } from '../bench-context';
import { dropDraft, keepDraft, readDraft } from './draft';
import { firstValues, toStartInput, type StartFormValues } from './form-values';
import { FoundFields } from './found-fields';
import { PlateFields } from './plate-fields';
import { ReadyToPull } from './ready-to-pull';
import { startFormSchema } from './start-schema';
import { OwnerField } from './owner-field';

interface StartFormProps {
  tag: TagView;
  tool: NonNullable<BenchSnapshot['tool']>;
}

/** The id of the form, for the key that submits it. */
export const START_FORM_ID = 'start-check';

/** Enter goes on to the next field: a check starts with Ctrl+Enter or its button alone. */
function onEnter(event: KeyboardEvent<HTMLFormElement>): void {
  if (event.key !== 'Enter' || event.ctrlKey || event.metaKey) return;
  if (!(event.target instanceof HTMLInputElement || event.target instanceof HTMLSelectElement)) {
    return;
  }
  event.preventDefault();
  const fields = [...event.currentTarget.elements].filter(
    (field): field is HTMLElement => field instanceof HTMLElement && field.tabIndex >= 0,
  );
  const stops = fields.filter((field) => !field.matches('fieldset, :disabled'));
  stops[stops.indexOf(event.target) + 1]?.focus();
}

/** Whose tool, what its plate says, how it came in, what is pulled; then the first pull. */
export function StartForm({ tag, tool }: StartFormProps) {
  const { bench } = useBench();
  const benchId = bench.bench.id;
  const schema = useMemo(() => startFormSchema(tool), [tool]);
  const form = useForm<StartFormValues, unknown, z.output<typeof startCheckSchema>>({
    defaultValues: firstValues(tool, { benchId, tagId: tag.id, consent: tag.consent }),
    resolver: zodResolver(schema),
    mode: 'onTouched',
  });
  const { control, handleSubmit, reset, setError, subscribe } = form;
  const start = useSteadyCommand<unknown>('check.start');

  useEffect(() => {
    const draft = readDraft(tag.id);
    if (draft) reset({ ...draft, benchId, tagId: tag.id }, { keepDefaultValues: true });
    return subscribe({
      formState: { values: true },
      callback: ({ values }) => keepDraft(tag.id, values),
    });
  }, [tag.id, benchId, reset, subscribe]);

  const values = useWatch({ control }) as StartFormValues;
  const input = toStartInput(values, tool);
  const plate = toolSchema.safeParse(input.tool);
  const unit = TORQUE_UNITS.find((known) => known === values.tool.unit) ?? 'N.m';

  const submit = handleSubmit((valid) => {
    if (start.isPending) return;
    start.mutate(valid, {
      onSuccess: () => dropDraft(tag.id),
      onError: ({ problem }) => {
        for (const [path, message] of Object.entries(problem.fields ?? {})) {
          setError(path as FieldPath<StartFormValues>, { type: 'post', message });
        }
      },
    });
  });

  return (
    <form
      id={START_FORM_ID}
      noValidate
      onSubmit={submit}
      onKeyDown={onEnter}
      className="grid gap-x-8 gap-y-5 px-5 py-3 lg:grid-cols-3"
    >
      <div className="flex min-w-0 flex-col gap-1">
        <OwnerField form={form} tag={tag} />
        <PlateFields form={form} toolClass={values.tool.toolClass} />
      </div>
      <div className="flex min-w-0 flex-col gap-4">
        <FoundFields
          form={form}
          scheme={values.scheme}
          consent={tag.consent}
          planName={schemeFacts(bench.meet.plan.scheme).name}
          unitLabel={unitText(unit)}
        />
      </div>
      <ReadyToPull
        form={form}
        toolClass={values.tool.toolClass}
        plate={plate.success ? plate.data : null}
        scheme={values.scheme}
        workingPoints={input.workingPoints}
        pending={start.isPending}
        error={start.error}
      />
    </form>
  );
}
