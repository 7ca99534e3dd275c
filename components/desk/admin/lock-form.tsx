'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { lockTesterSchema } from '@/lib/desk/tester';
import { TextInput } from '@/components/ui/text-input';
import { FormFoot } from './form-foot';
import { fieldsOf, useSendCommand } from './use-desk-form';

type Lock = z.infer<typeof lockTesterSchema>;

/** Locks a tester, with the reason that everybody sees. */
export function LockForm({ testerId }: { testerId: string }) {
  const form = useForm<Lock>({
    resolver: zodResolver(lockTesterSchema),
    defaultValues: { testerId, reason: '' },
  });
  const sending = useSendCommand<Lock, Lock>(form, 'tester.lock');
  return (
    <form
      method="post"
      onSubmit={form.handleSubmit(sending.send)}
      noValidate
      className="flex flex-col gap-4"
    >
      <TextInput
        label="Reason"
        hint="Such as: dropped this morning."
        {...fieldsOf(form)('reason')}
      />
      <FormFoot sending={sending} label="Lock the tester" savedWords="Locked." danger />
    </form>
  );
}
