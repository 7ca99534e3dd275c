'use client';

import { useRef, useState } from 'react';
import type { CheckView, TagView } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { Kbd } from '../ui/kbd';
import { Notice } from '../ui/notice';
import { useBench } from './bench-context';
import { BenchFrame, TwoColumns } from './bench-frame';
import { ProblemNotice } from './problem-notice';
import { CheckPanels, type CheckPanel } from './pull/check-panels';
import { CorridorSide } from './pull/corridor-side';
import { entryNeeds } from './pull/entry';
import { entryMessage } from './pull/entry-message';
import { Instruction } from './pull/instruction';
import { OfferedValue } from './pull/offered-value';
import { pullActions } from './pull/pull-actions';
import { ReadingEntry } from './pull/reading-entry';
import { useTesterUnit } from './pull/tester-unit';
import { useEntry } from './pull/use-entry';
import { useSimulate } from './pull/use-simulate';
import { ToolLine } from './tool-line';
import { WaitingForTester } from './pull/waiting-for-tester';

/** The pulls, one at a time: left what to do, right how it fills up. */
export function PullPhase({ check, tag }: { check: CheckView; tag: TagView }) {
  const { bench, connected, crowded } = useBench();
  const tester = bench.tester;
  const [panel, setPanel] = useState<CheckPanel | null>(null);
  const [typesInstead, setTypesInstead] = useState(false);
  const [unit, setUnit] = useTesterUnit(tester?.id ?? 'none');
  const field = useRef<HTMLInputElement>(null);
  const pause = useCommand<{ checkId: string }>(check.paused ? 'check.resume' : 'check.pause');
  const simulate = useSimulate(bench.bench.id);

  const sendsItself = tester !== null && tester.kind !== 'keyed';
  const needs = entryNeeds(check, !sendsItself || typesInstead);
  const listens = sendsItself && !typesInstead && !check.offered && !check.paused;
  const goesOn = check.paused && !check.offered;
  const onPause = () => pause.mutate({ checkId: check.id });
  const focusField = () => field.current?.focus();
  const entry = useEntry({ check, needs, unit, connected, onEmpty: focusField });
  const step = check.offeredStep ?? check.step;

  const message =
    entryMessage(entry) ??
    (check.offered ? (
      <OfferedValue check={check} pull={check.offered} />
    ) : check.paused ? (
      <Notice kind="problem" title="Paused">
        Nothing is taken until the check goes on.
      </Notice>
    ) : undefined);

  const close = () => {
    setPanel(null);
    // Once the panel is gone: the next keys are the next value again.
    requestAnimationFrame(focusField);
  };
  const actions = pullActions({
    check,
    needs,
    entry,
    isSimulated: tester?.kind === 'simulated',
    sendsItself,
    typesInstead,
    busy: pause.isPending || simulate.isPending,
    open: setPanel,
    onPause,
    onSimulate: () => simulate.mutate(),
    onTypeInstead: () => setTypesInstead(!typesInstead),
  });

  return (
    <BenchFrame
      actions={panel ? [{ key: 'escape', label: 'close', run: close }] : actions}
      className="lg:overflow-hidden"
    >
      <TwoColumns
        left={
          <>
            {!crowded && <ToolLine tag={tag} size="middle" />}
            {step && (
              <Instruction step={step} code={crowded ? tag.code : null}>
                {message}
              </Instruction>
            )}
            {listens && (
              <WaitingForTester
                simulated={tester?.kind === 'simulated'}
                pending={simulate.isPending}
                onSimulate={() => simulate.mutate()}
              />
            )}
            {goesOn && (
              <Button size="big" wide pending={pause.isPending} onClick={onPause}>
                Go on <Kbd>Enter</Kbd>
              </Button>
            )}
            {needs && !goesOn && (
              <ReadingEntry
                check={check}
                needs={needs}
                entry={entry}
                unit={unit}
                onUnit={setUnit}
                field={field}
              />
            )}
            <ProblemNotice errors={[pause.error, simulate.error]} />
          </>
        }
        right={
          panel ? (
            <CheckPanels
              panel={panel}
              check={check}
              tag={tag}
              unit={unit}
              actions={actions}
              onClose={close}
            />
          ) : (
            <>
              {check.barred.length > 0 && (
                <Notice kind="problem" title="Not judged on this tester today">
                  Because {check.barred.join(', and ')}.
                </Notice>
              )}
              <CorridorSide
                check={check}
                step={step}
                onChoose={(pull) => setPanel({ kind: 'void', pullId: pull.id })}
              />
            </>
          )
        }
      />
    </BenchFrame>
  );
}
