'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useForm, useWatch } from 'react-hook-form';
import type { z } from 'zod';
import {
  changeStaffSchema,
  newPersonSchema,
  newPasswordSchema,
  type NewPersonInput,
} from '@/lib/desk/staff';
import { CommandError, type ProblemAnswer } from '@/components/live/use-command';
import { Checkbox } from '@/components/ui/checkbox';
import { RadioCards } from '@/components/ui/radio-cards';
import { TextInput } from '@/components/ui/text-input';
import { FormFoot } from './form-foot';
import { ROLE_OPTIONS } from './role-words';
import type { StaffLine } from './staff-table';
import { fieldsOf, useSendCommand, useSending } from './use-desk-form';

/** An answer of a server action: its result, or what was refused. */
export type ActionAnswer<Result> = { result: Result } | { problem: ProblemAnswer };

/** A password goes to an action of the page, which hashes it: no command sees the words. */
const through =
  <Result,>(action: (input: unknown) => Promise<ActionAnswer<Result>>) =>
  async (input: unknown): Promise<Result> => {
    const answer = await action(input);
    if ('problem' in answer) throw new CommandError(answer.problem);
    return answer.result;
  };

/** Adds a person. */
export function NewPersonForm({
  action,
}: {
  action: (input: unknown) => Promise<ActionAnswer<unknown>>;
}) {
  const blank: NewPersonInput = { name: '', login: '', role: 'operator', password: '' };
  const form = useForm<NewPersonInput, unknown, z.output<typeof newPersonSchema>>({
    resolver: zodResolver(newPersonSchema),
    defaultValues: blank,
  });
  const sending = useSending(form, through(action));
  const field = fieldsOf(form);
  const role = useWatch({ control: form.control, name: 'role' });
  const submit = form.handleSubmit(async (values) => {
    if (await sending.send(values)) form.reset(blank);
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="flex flex-col gap-5">
      <TextInput label="Name" autoComplete="off" {...field('name')} />
      <TextInput
        label="Sign-in name"
        autoComplete="off"
        autoCapitalize="none"
        spellCheck={false}
        {...field('login')}
      />
      <TextInput
        label="Password"
        hint="At least 10 characters. Tell the person yourself."
        type="password"
        autoComplete="new-password"
        {...field('password')}
      />
      <RadioCards legend="Role" options={ROLE_OPTIONS} value={role} {...field('role')} />
      <FormFoot sending={sending} label="Add the person" savedWords="Added." />
    </form>
  );
}

/** Changes a person's name, role, and whether they may sign in. */
export function PersonForm({ person }: { person: StaffLine }) {
  const form = useForm<
    z.input<typeof changeStaffSchema>,
    unknown,
    z.output<typeof changeStaffSchema>
  >({
    resolver: zodResolver(changeStaffSchema),
    defaultValues: {
      staffId: person.id,
      name: person.name,
      role: person.role,
      active: person.active,
    },
  });
  const sending = useSendCommand(form, 'staff.change');
  const field = fieldsOf(form);
  const role = useWatch({ control: form.control, name: 'role' });
  return (
    <form
      method="post"
      onSubmit={form.handleSubmit(sending.send)}
      noValidate
      className="flex flex-col gap-5"
    >
      <TextInput label="Name" autoComplete="off" {...field('name')} />
      <RadioCards legend="Role" options={ROLE_OPTIONS} value={role} {...field('role')} />
      <Checkbox
        label="May sign in"
        hint="Without it, every session ends at once, and a bench is left."
        {...field('active')}
      />
      <FormFoot sending={sending} label="Save the person" />
    </form>
  );
}

/** Gives a person a new password. */
export function PasswordForm({
  staffId,
  action,
}: {
  staffId: string;
  action: (input: unknown) => Promise<ActionAnswer<unknown>>;
}) {
  const form = useForm<
    z.input<typeof newPasswordSchema>,
    unknown,
    z.output<typeof newPasswordSchema>
  >({
    resolver: zodResolver(newPasswordSchema),
    defaultValues: { staffId, password: '' },
  });
  const sending = useSending(form, through(action));
  const submit = form.handleSubmit(async (values) => {
    if (await sending.send(values)) form.reset({ staffId, password: '' });
  });
  return (
    <form method="post" onSubmit={submit} noValidate className="flex flex-col gap-5">
      <TextInput
        label="New password"
        hint="At least 10 characters. Every session of this person ends."
        type="password"
        autoComplete="new-password"
        {...fieldsOf(form)('password')}
      />
      <FormFoot sending={sending} label="Set the password" savedWords="The new password holds." />
    </form>
  );
}
