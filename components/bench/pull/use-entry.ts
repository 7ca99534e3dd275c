'use client';

import { useEffect, useRef, useState } from 'react';
import type { CheckView } from '@/lib/live/contract';
import type { acceptPullSchema, RecordPullInput } from '@/lib/record/pull-input';
import type { TorqueUnit } from '@/lib/torque/units';
import type { z } from 'zod';
import type { CommandError } from '../../live/use-command';
import { isUnanswered, useSteadyCommand } from '../use-steady-command';
import { readEntry, type EntryErrors, type EntryNeeds, type EntryText } from './entry';

type AcceptPullInput = z.input<typeof acceptPullSchema>;

const EMPTY: EntryText = { value: '', toolValue: '' };

export interface Entry {
  text: EntryText;
  type: (field: keyof EntryText, typed: string) => void;
  /** Takes what stands there; again after a question means yes. */
  submit: () => void;
  /** Empties the fields and forgets the question. */
  retype: () => void;
  errors: EntryErrors;
  /** The question of the post about a value that looks mistyped. */
  doubt: string | null;
  pending: boolean;
  /** Sent, and no answer came: the fields stay as they are until one does. */
  unanswered: boolean;
  /** Refused for a reason that belongs to no field. */
  refusal: CommandError | null;
}

interface EntryOptions {
  check: CheckView;
  needs: EntryNeeds | null;
  unit: TorqueUnit;
  connected: boolean;
  /** The fields are empty again: the pull was taken, or its values are to be typed anew. */
  onEmpty: () => void;
}

/** The values of the pull in hand, from typing to the answer of the post. */
export function useEntry({ check, needs, unit, connected, onEmpty }: EntryOptions): Entry {
  const [text, setText] = useState(EMPTY);
  const [errors, setErrors] = useState<EntryErrors>({});
  const [decided, setDecided] = useState<string | null>(null);
  const record = useSteadyCommand<RecordPullInput>('pull.record');
  const accept = useSteadyCommand<AcceptPullInput>('pull.accept');
  const last = useRef<'record' | 'accept'>('record');

  const error = record.error ?? accept.error;
  // A question is about the value that it was asked about, and about no other that came since.
  const asked = check.offered
    ? accept.variables?.pullId === check.offered.id && accept.error
    : record.error;
  const doubt = asked && asked.problem.code === 'confirm' ? asked.problem.detail : null;
  const unanswered = isUnanswered(error);
  const isSettled = decided !== null && decided === check.offered?.id;
  const pending = record.isPending || accept.isPending || isSettled;

  const forget = () => {
    record.reset();
    accept.reset();
    setErrors({});
  };
  const taken = () => {
    setText(EMPTY);
    forget();
    onEmpty();
  };
  const sendRecord = (input: RecordPullInput) => {
    last.current = 'record';
    record.mutate(input, { onSuccess: taken });
  };
  const sendAccept = (input: AcceptPullInput) => {
    last.current = 'accept';
    accept.mutate(input, {
      onSuccess: () => {
        setDecided(input.pullId);
        taken();
      },
    });
  };
  const sendAgain = () => {
    if (last.current === 'record' && record.variables) sendRecord(record.variables);
    if (last.current === 'accept' && accept.variables) sendAccept(accept.variables);
  };

  const submit = () => {
    if (pending || !needs) return;
    if (unanswered) return sendAgain();
    const read = readEntry(text, needs);
    if ('errors' in read) return setErrors(read.errors);
    setErrors({});
    const confirmed = doubt !== null;
    const { value, toolValue } = read.numbers;
    if (check.offered) sendAccept({ pullId: check.offered.id, toolValue, confirmed });
    else {
      // A value that the tester sent this very moment must not push a typed one to the next step.
      const stepIndex = needs.value ? (check.step?.index ?? null) : null;
      sendRecord({ checkId: check.id, value, unit, toolValue, stepIndex, confirmed });
    }
  };

  // What went out unanswered goes out again, under its own id, when the post is heard again.
  const heard = useRef(connected);
  useEffect(() => {
    if (connected && !heard.current && unanswered) sendAgain();
    heard.current = connected;
  });

  const fields = error?.problem.fields ?? {};
  const hasFieldWords = fields.value !== undefined || fields.toolValue !== undefined;
  return {
    text,
    type: (field, typed) => {
      setText((before) => ({ ...before, [field]: typed }));
      if (!unanswered) forget();
    },
    submit,
    retype: () => {
      setText(EMPTY);
      forget();
      onEmpty();
    },
    errors: { ...fields, ...errors },
    doubt,
    pending,
    unanswered,
    refusal:
      error && error.problem.code !== 'confirm' && !unanswered && !hasFieldWords ? error : null,
  };
}
