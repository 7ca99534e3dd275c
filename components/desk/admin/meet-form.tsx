'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { meetDetailsSchema, newMeetSchema } from '@/lib/desk/meet';
import { FormFoot } from './form-foot';
import { MeetFields } from './meet-fields';
import { fieldsOf, useSendCommand } from './use-desk-form';
import { NumberInput } from '@/components/ui/number-input';

type NewMeet = z.input<typeof newMeetSchema>;
type Details = z.input<typeof meetDetailsSchema>;

/** Makes a meet with its benches. */
export function NewMeetForm({ defaults, timeZones }: { defaults: NewMeet; timeZones: string[] }) {
  const router = useRouter();
  const form = useForm<NewMeet, unknown, z.output<typeof newMeetSchema>>({
    resolver: zodResolver(newMeetSchema),
    defaultValues: defaults,
  });
  const sending = useSendCommand<NewMeet, z.output<typeof newMeetSchema>, { slug: string }>(
    form,
    'meet.create',
    { done: ({ slug }) => router.push(`/desk/benches?meet=${slug}`) },
  );
  const field = fieldsOf(form);
  return (
    <form
      method="post"
      onSubmit={form.handleSubmit(sending.send)}
      noValidate
      className="flex max-w-prose flex-col gap-6"
    >
      <MeetFields field={field} timeZones={timeZones} />
      <NumberInput label="Benches" hint="1 to 8. More can be added later." {...field('benches')} />
      <FormFoot sending={sending} label="Make the meet" />
    </form>
  );
}

/** Changes what is known of a meet. */
export function MeetForm({
  meetId,
  details,
  timeZones,
}: {
  meetId: string;
  details: Details;
  timeZones: string[];
}) {
  const form = useForm<Details, unknown, z.output<typeof meetDetailsSchema>>({
    resolver: zodResolver(meetDetailsSchema),
    defaultValues: details,
  });
  const sending = useSendCommand(form, 'meet.change', {
    input: (values) => ({ meetId, details: values }),
  });
  return (
    <form
      method="post"
      onSubmit={form.handleSubmit(sending.send)}
      noValidate
      className="flex max-w-prose flex-col gap-6"
    >
      <MeetFields field={fieldsOf(form)} timeZones={timeZones} />
      <FormFoot sending={sending} label="Save the meet" />
    </form>
  );
}
