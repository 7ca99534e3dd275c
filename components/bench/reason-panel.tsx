'use client';

import { useState, type FormEvent, type ReactNode } from 'react';
import type { CommandError } from '../live/use-command';
import { Button } from '../ui/button';
import { TextInput } from '../ui/text-input';
import { BenchPanel } from './bench-panel';

interface ReasonPanelProps {
  title: ReactNode;
  label: string;
  /** Reasons that are often the right ones; a tap fills the line, which can still be changed. */
  usual?: readonly string[];
  submitLabel: string;
  /** May the reason be left out? */
  optional?: boolean;
  maxLength?: number;
  pending: boolean;
  error: CommandError | null;
  onSubmit: (reason: string) => void;
  onClose: () => void;
  /** What else is to be settled, above the reason. */
  children?: ReactNode;
}

/** Asks why, in a few words, typed or tapped. */
export function ReasonPanel({
  title,
  label,
  usual = [],
  submitLabel,
  optional = false,
  maxLength = 300,
  pending,
  error,
  onSubmit,
  onClose,
  children,
}: ReasonPanelProps) {
  const [text, setText] = useState('');
  const [missing, setMissing] = useState(false);
  // A number that was meant for another field is no reason.
  const isEnough = /\p{L}/u.test(text) || (optional && text.trim() === '');
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (pending) return;
    setMissing(!isEnough);
    if (isEnough) onSubmit(text.trim());
  };
  const problem = missing && !isEnough ? 'A few words, please.' : error?.problem.detail;
  return (
    <BenchPanel title={title} onClose={onClose}>
      <form onSubmit={submit} className="flex flex-col gap-4">
        {children}
        {usual.length > 0 && (
          <div className="flex flex-wrap gap-2" role="group" aria-label="Usual words">
            {usual.map((words) => (
              <Button key={words} variant="secondary" onClick={() => setText(words)}>
                {words}
              </Button>
            ))}
          </div>
        )}
        <TextInput
          label={label}
          hint="It is kept for good: no names, please."
          optional={optional}
          value={text}
          maxLength={maxLength}
          autoFocus
          autoComplete="off"
          error={problem}
          onChange={(event) => setText(event.target.value)}
        />
        <Button type="submit" size="big" pending={pending} className="self-start">
          {submitLabel}
        </Button>
      </form>
    </BenchPanel>
  );
}
