'use client';

import { useState } from 'react';
import type { CheckView, TagView } from '@/lib/live/contract';
import { useCommand } from '../live/use-command';
import { Button } from '../ui/button';
import { Kbd } from '../ui/kbd';
import { VerdictHeading } from '../verdict/verdict-mark';
import { useBench } from './bench-context';
import { BenchFrame, TwoColumns } from './bench-frame';
import type { BenchAction } from './keys';
import { missingWords } from './missing-words';
import { PointResults } from './point-results';
import { ProblemNotice } from './problem-notice';
import { CheckPanels, type CheckPanel } from './pull/check-panels';
import { useTesterUnit } from './pull/tester-unit';
import { ToolLine } from './tool-line';

/** Every pull is taken, or they were stopped early: the verdict in words, and the signature. */
export function SignOffPhase({ check, tag }: { check: CheckView; tag: TagView }) {
  const { bench } = useBench();
  const [panel, setPanel] = useState<CheckPanel | null>(null);
  const [unit] = useTesterUnit(bench.tester?.id ?? 'none');
  const signOff = useCommand<{ checkId: string }>('check.sign-off');
  const sign = () => signOff.mutate({ checkId: check.id });
  const close = () => setPanel(null);

  const actions: BenchAction[] = [
    { key: 'ctrl+enter', label: 'sign off', run: sign, disabled: signOff.isPending },
    {
      key: 'v',
      label: 'void a pull',
      run: () => setPanel({ kind: 'void', pullId: null }),
      disabled: check.pulls.every(({ state }) => state === 'voided'),
    },
    { key: 'n', label: 'note', run: () => setPanel({ kind: 'note' }) },
    { key: 'a', label: 'give up', run: () => setPanel({ kind: 'abandon' }) },
    { key: '?', label: 'all keys', run: () => setPanel({ kind: 'keys' }), atEnd: true },
  ];

  return (
    <BenchFrame actions={panel ? [{ key: 'escape', label: 'close', run: close }] : actions}>
      <TwoColumns
        left={
          <>
            <ToolLine tag={tag} />
            <div className="flex min-h-0 flex-1 flex-col gap-3 overflow-y-auto">
              <div aria-live="polite">
                <VerdictHeading verdict={check.verdict} words={check.statement} level={2} />
              </div>
              <p className="text-fore-quiet">{check.planName}</p>
              {check.stoppedEarly && <p className="text-lg font-bold">Stopped early.</p>}
              <Words title="Missing" lines={missingWords(check.missing)} />
              <Words title="Not followed" lines={check.notFollowed} />
              <Words title="Notes" lines={check.notes.map(({ text }) => text)} />
            </div>
            <div className="flex flex-col gap-2">
              <ProblemNotice errors={[signOff.error]} />
              <Button
                size="big"
                wide
                pending={signOff.isPending}
                pendingLabel="Signing…"
                onClick={sign}
                className="min-h-20 text-2xl"
              >
                Sign off <Kbd>Ctrl+Enter</Kbd>
              </Button>
              <p className="text-fore-quiet">A signed record is never altered.</p>
            </div>
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
            <PointResults check={check} />
          )
        }
      />
    </BenchFrame>
  );
}

function Words({ title, lines }: { title: string; lines: readonly string[] }) {
  if (lines.length === 0) return null;
  return (
    <section aria-label={title}>
      <h3 className="font-bold">{title}</h3>
      <ul className="list-disc pl-5 leading-snug">
        {lines.map((line, index) => (
          <li key={index}>{line}</li>
        ))}
      </ul>
    </section>
  );
}
