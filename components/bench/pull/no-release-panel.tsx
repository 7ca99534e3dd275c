'use client';

import { useState, type FormEvent } from 'react';
import { parseDecimal } from '@/lib/line/join';
import type { CheckView } from '@/lib/live/contract';
import type { AcceptPullInput, RecordPullInput } from '@/lib/record/pull-input';
import { unitText, type TorqueUnit } from '@/lib/torque/units';
import { Button } from '../../ui/button';
import { NumberInput } from '../../ui/number-input';
import { WarningShape } from '../../ui/warning-shape';
import { BenchPanel } from '../bench-panel';
import { ProblemNotice } from '../problem-notice';
import { useSteadyCommand } from '../use-steady-command';

interface NoReleasePanelProps {
  check: CheckView;
  unit: TorqueUnit;
  onClose: () => void;
}

/**
 * A setting tool that was set right and did not let go: that is its reading at this point. What the
 * tester has sent already is how far it was pulled; else it is typed.
 */
export function NoReleasePanel({ check, unit, onClose }: NoReleasePanelProps) {
  const [text, setText] = useState('');
  const [error, setError] = useState<string>();
  const record = useSteadyCommand<RecordPullInput>('pull.record');
  const accept = useSteadyCommand<AcceptPullInput>('pull.accept');
  const { offered } = check;
  const step = offered ? check.offeredStep : check.step;
  const isPending = record.isPending || accept.isPending;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (isPending) return;
    if (offered) {
      accept.mutate(
        { pullId: offered.id, outcome: 'no-release', confirmed: true },
        { onSuccess: onClose },
      );
      return;
    }
    const value = parseDecimal(text);
    if (value === null || Number.isNaN(value)) return setError('Type the highest torque reached.');
    setError(undefined);
    record.mutate(
      {
        checkId: check.id,
        value,
        unit,
        outcome: 'no-release',
        stepIndex: check.step?.index ?? null,
        confirmed: true,
      },
      { onSuccess: onClose },
    );
  };
  const refused = record.error?.problem.fields?.value;
  return (
    <BenchPanel
      title={
        <span className="flex items-center gap-4">
          <WarningShape className="size-14 shrink-0" /> Stop pulling
        </span>
      }
      onClose={onClose}
    >
      <p className="text-xl leading-snug">
        Set to {step?.targetLabel} {step?.unitLabel}, and it did not let go: never pull it beyond{' '}
        {step?.stopLabel}. How far was it pulled? A pull that ended too low proves nothing, and the
        record says so.
      </p>
      <form onSubmit={submit} className="flex items-end gap-3">
        {offered ? (
          <p className="text-xl">
            The tester sent <strong className="font-reading">{offered.reference}</strong>.
          </p>
        ) : (
          <NumberInput
            data-number
            autoFocus
            size="big"
            label="Highest torque the tester showed"
            unit={unitText(unit)}
            value={text}
            error={error ?? refused}
            onChange={(event) => setText(event.target.value)}
            fieldClassName="w-96"
          />
        )}
        <Button
          type="submit"
          size="big"
          autoFocus={offered !== null}
          pending={isPending}
          className="min-h-20"
        >
          It did not let go
        </Button>
      </form>
      {!refused && <ProblemNotice errors={[record.error, accept.error]} />}
    </BenchPanel>
  );
}
