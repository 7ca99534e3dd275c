'use client';

import type { ComponentProps } from 'react';
import { useFormStatus } from 'react-dom';
import { Button } from './button';

/** The submit button of a form with an action: shows that it is sending, and sends once. */
export function SubmitButton({
  pendingLabel = 'Sending…',
  ...rest
}: Omit<ComponentProps<typeof Button>, 'type' | 'pending'>) {
  const { pending } = useFormStatus();
  return <Button {...rest} type="submit" pending={pending} pendingLabel={pendingLabel} />;
}
