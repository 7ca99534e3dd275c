'use client';

import { useState } from 'react';
import type { CheckView } from '@/lib/live/contract';
import { mayVoid, VOID_FAULT_LABELS, VOID_FAULTS, type VoidFault } from '@/lib/torque/faults';
import { useCommand } from '../../live/use-command';
import { Button } from '../../ui/button';
import { Kbd } from '../../ui/kbd';
import { Notice } from '../../ui/notice';
import { TextInput } from '../../ui/text-input';
import { useBench } from '../bench-context';
import { BenchPanel } from '../bench-panel';
import { ProblemNotice } from '../problem-notice';
import { useKeys } from '../use-keys';
import { pullName, pullValue, samePoint, voidable } from './pull-words';

interface VoidPanelProps {
  check: CheckView;
  /** The pull to begin with; the last one when left out. */
  pullId: string | null;
  onClose: () => void;
}

/** Voids a pull for a listed fault of the pull, never for its value. */
export function VoidPanel({ check, pullId, onClose }: VoidPanelProps) {
  const { me } = useBench();
  const pulls = voidable(check.pulls);
  const [chosen, setChosen] = useState(pullId ?? check.offered?.id ?? pulls.at(-1)?.id ?? null);
  const [fault, setFault] = useState<VoidFault | null>(null);
  const [note, setNote] = useState('');
  const [missing, setMissing] = useState(false);
  const voidIt = useCommand<{ pullId: string; fault: VoidFault; note: string }>('pull.void');

  const at = pulls.findIndex(({ id }) => id === chosen);
  const pull = pulls[at];
  const step = (by: number) => setChosen(pulls[at + by]?.id ?? chosen);
  const voidedAtPoint = check.pulls.filter(
    (other) => pull && other.state === 'voided' && samePoint(pull, other),
  ).length;
  const isAllowed = mayVoid({ voidedAtPoint, role: me.role });

  const submit = () => {
    setMissing(fault === null);
    if (!pull || fault === null || voidIt.isPending || !isAllowed) return;
    voidIt.mutate({ pullId: pull.id, fault, note: note.trim() }, { onSuccess: onClose });
  };

  useKeys([
    ...VOID_FAULTS.map((one, index) => ({
      key: String(index + 1),
      label: VOID_FAULT_LABELS[one],
      run: () => setFault(one),
    })),
    { key: 'arrowleft', label: 'earlier pull', run: () => step(-1) },
    { key: 'arrowright', label: 'later pull', run: () => step(1) },
    { key: 'enter', label: 'void it', run: submit },
  ]);

  if (!pull) {
    return (
      <BenchPanel title="Void a pull" onClose={onClose}>
        <p>There is no pull to void.</p>
      </BenchPanel>
    );
  }
  return (
    <BenchPanel title="What went wrong with the pull?" onClose={onClose}>
      <div className="flex items-center gap-3">
        <Button
          variant="secondary"
          aria-label="Earlier pull"
          aria-disabled={at === 0 || undefined}
          onClick={() => step(-1)}
        >
          ←
        </Button>
        <p className="min-w-0 flex-1 text-center leading-snug" aria-live="polite">
          {pullName(pull)}
          <br />
          <strong>{pullValue(pull)}</strong>
        </p>
        <Button
          variant="secondary"
          aria-label="Later pull"
          aria-disabled={at === pulls.length - 1 || undefined}
          onClick={() => step(1)}
        >
          →
        </Button>
      </div>
      {isAllowed ? (
        <form
          className="flex flex-col gap-3"
          onSubmit={(event) => {
            event.preventDefault();
            submit();
          }}
        >
          <div
            className="grid gap-2 sm:grid-cols-2"
            role="group"
            aria-label="The fault of the pull"
          >
            {VOID_FAULTS.map((one, index) => (
              <button
                key={one}
                type="button"
                aria-pressed={fault === one}
                onClick={() => setFault(one)}
                className="border-control aria-pressed:border-fore aria-pressed:ring-fore flex min-h-13 items-center gap-3 rounded-lg border-2 px-3 text-left leading-tight font-semibold aria-pressed:ring-2"
              >
                <Kbd>{index + 1}</Kbd> {VOID_FAULT_LABELS[one]}
              </button>
            ))}
          </div>
          {missing && fault === null && (
            <Notice kind="problem">Choose what went wrong with the pull.</Notice>
          )}
          <TextInput
            label="Note"
            optional
            value={note}
            maxLength={300}
            autoComplete="off"
            onChange={(event) => setNote(event.target.value)}
          />
          <ProblemNotice errors={[voidIt.error]} />
          <div className="flex flex-wrap items-center gap-4">
            <Button type="submit" size="big" pending={voidIt.isPending}>
              Void it <Kbd>Enter</Kbd>
            </Button>
            <p className="text-fore-quiet max-w-md">
              It stays on the record, marked void, and the pull is made again. A value alone is no
              fault.
            </p>
          </div>
        </form>
      ) : (
        <Notice kind="problem" title="A lead must void the next one here">
          Two pulls at this point are voided already. Ask a lead to sign in at this bench.
        </Notice>
      )}
    </BenchPanel>
  );
}
