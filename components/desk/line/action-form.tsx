'use client';

import { useForm } from 'react-hook-form';
import { useCommand } from '@/components/live/use-command';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { Notice } from '@/components/ui/notice';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import type { ActionField, TagAction } from './actions';

interface ActionFormProps {
  tagId: string;
  action: TagAction;
  onDone: (words: string) => void;
}

const WHOLE_NUMBER = { value: /^\s*\d+\s*$/, message: 'A whole number, please.' };

const rulesOf = (field: ActionField) => ({
  ...(field.isOptional ? {} : { required: 'Fill this in.' }),
  ...(field.kind === 'number' ? { pattern: WHOLE_NUMBER } : {}),
});

/** One action of a tag: a button when nothing is asked, else a form that folds open. */
export function ActionForm({ tagId, action, onDone }: ActionFormProps) {
  const command = useCommand<Record<string, unknown>>(action.command);
  const { register, handleSubmit, setError, formState, reset } = useForm<Record<string, string>>({
    defaultValues: Object.fromEntries(
      action.fields.map(({ name, initial = '' }) => [name, initial]),
    ),
  });
  const submit = handleSubmit((values) =>
    command.mutate(
      { tagId, ...action.input(values) },
      {
        onSuccess: () => {
          reset();
          onDone(action.done);
        },
        onError: ({ problem }) => {
          for (const [name, message] of Object.entries(problem.fields ?? {})) {
            if (action.fields.some((field) => field.name === name)) setError(name, { message });
          }
        },
      },
    ),
  );
  const form = (
    <form onSubmit={submit} noValidate className="flex flex-col gap-3">
      {action.fields.map((field) => {
        const words = {
          label: field.label,
          hint: field.hint,
          error: formState.errors[field.name]?.message,
          optional: field.isOptional ?? false,
        };
        return field.kind === 'choice' ? (
          <Select
            key={field.name}
            {...words}
            options={field.options ?? []}
            {...register(field.name, rulesOf(field))}
          />
        ) : (
          <TextInput
            key={field.name}
            {...words}
            inputMode={field.kind === 'number' ? 'numeric' : 'text'}
            autoComplete="off"
            {...register(field.name, rulesOf(field))}
          />
        );
      })}
      {command.error && (
        <Notice kind="problem" title={command.error.problem.title}>
          <p>{command.error.problem.detail}</p>
        </Notice>
      )}
      <Button
        type="submit"
        variant={action.isGrave ? 'danger' : action.fields.length > 0 ? 'primary' : 'secondary'}
        pending={command.isPending}
        pendingLabel="Sending…"
        wide
      >
        {action.submit}
      </Button>
    </form>
  );
  if (action.fields.length === 0 && !action.isGrave) return <div className="py-2">{form}</div>;
  return (
    <Disclosure summary={action.title} className="border-line border-t">
      {form}
    </Disclosure>
  );
}
