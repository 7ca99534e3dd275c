'use client';

import type { TagView } from '@/lib/live/contract';
import { Checkbox } from '../../ui/checkbox';
import { ToolLine } from '../tool-line';
import { fieldWords } from './field-words';
import type { StartFormApi } from './start-schema';

interface OwnerFieldProps {
  form: StartFormApi;
  tag: TagView;
}

/** Whose tool it is: the tag on the tool, the ticket and the person belong together. */
export function OwnerField({ form, tag }: OwnerFieldProps) {
  const { register, formState } = form;
  const whose = tag.visitorName ? `${tag.visitorName}’s tool` : 'this visitor’s';
  return (
    <div className="flex flex-col gap-1">
      <ToolLine tag={tag} size="middle" />
      <Checkbox
        {...register('ownerConfirmed')}
        autoFocus
        label={
          <strong>
            Ticket and tag say {tag.code}; it is {whose}
          </strong>
        }
        error={fieldWords(formState.errors, 'ownerConfirmed')}
      />
    </div>
  );
}
