'use client';

import { useState, type FormEvent } from 'react';
import type { TagView } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { Kbd } from '../ui/kbd';
import { TextInput } from '../ui/text-input';
import { WarningShape } from '../ui/warning-shape';
import { ProblemNotice } from './problem-notice';

interface HandBackFormProps {
  tag: Pick<TagView, 'id' | 'code'>;
  onDone?: () => void;
}

/** The tool goes home: the code on the visitor's ticket must be the code of the tool in hand. */
export function HandBackForm({ tag, onDone }: HandBackFormProps) {
  const [code, setCode] = useState('');
  const handBack = useCommand<{ tagId: string; ticketCode: string }>('tag.hand-back');
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (handBack.isPending) return;
    handBack.mutate({ tagId: tag.id, ticketCode: code }, { onSuccess: () => onDone?.() });
  };
  const problem = handBack.error?.problem;
  const isWrongTool = problem?.code === 'conflict';
  return (
    <form onSubmit={submit} className="flex flex-col gap-4">
      <div className="flex items-end gap-3">
        <TextInput
          label="Code on the visitor’s ticket"
          hint="Read it off their phone, not off the tool."
          value={code}
          autoFocus
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          maxLength={10}
          error={isWrongTool ? undefined : problem?.fields?.ticketCode}
          onChange={(event) => {
            setCode(event.target.value);
            handBack.reset();
          }}
          className="font-code min-h-20 text-5xl font-bold uppercase"
          fieldClassName="w-72"
        />
        <Button type="submit" size="big" pending={handBack.isPending} className="min-h-20">
          Hand back <Kbd>Enter</Kbd>
        </Button>
      </div>
      {isWrongTool && (
        <div
          role="alert"
          className="border-fore bg-band flex items-center gap-5 border-8 border-double p-5"
        >
          <WarningShape className="size-16 shrink-0" />
          <p className="text-3xl leading-tight font-bold">{problem.detail}</p>
        </div>
      )}
      {problem && !isWrongTool && !problem.fields?.ticketCode && (
        <ProblemNotice errors={[handBack.error]} />
      )}
    </form>
  );
}
