'use client';

import type { ReactNode } from 'react';
import type { StepView } from '@/lib/live/contract';

/** Progress of one set point in bars. Neutral on purpose: a reading taken is not a reading passed. */
function PullBars({ step }: { step: StepView }) {
  return (
    <div
      role="img"
      aria-label={`${step.number - 1} of ${step.of} pulls here taken`}
      className="mt-2 flex gap-2"
    >
      {Array.from({ length: step.of }, (_, index) => (
        <span
          key={index}
          className={
            index < step.number - 1
              ? 'bg-fore h-3 flex-1 rounded-full'
              : 'border-control h-3 flex-1 rounded-full border-2'
          }
        />
      ))}
    </div>
  );
}

interface InstructionProps {
  /** The step in hand: the one of a waiting value, else the one that is due. */
  step: StepView;
  /** The tag's code, where the tag itself has given way. */
  code: string | null;
  /** Something to settle first: it stands in the place of the instruction. */
  children?: ReactNode;
}

/** One big instruction at a time: where we are, the torque, the pull, what to do. */
export function Instruction({ step, code, children }: InstructionProps) {
  return (
    <section aria-label="The pull in hand">
      <h2 className="text-fore-quiet text-xl leading-tight">
        {code !== null && <strong className="text-fore">{code} · </strong>}
        {step.heading}
      </h2>
      <p className="font-code flex items-baseline gap-3 leading-none font-bold">
        <span className="text-[6.6rem] leading-[0.98] tracking-tight">{step.targetLabel}</span>
        <span className="text-5xl font-semibold">{step.unitLabel}</span>
      </p>
      <p className="mt-1 text-2xl leading-tight font-bold">{step.pullWords}</p>
      <PullBars step={step} />
      <div className="mt-3">
        {children ?? (
          <p className="bg-band border-fore border-l-6 px-4 py-2.5 text-lg leading-snug">
            {step.instruction}
            {step.stopLabel && <strong className="block">Stop pulling at {step.stopLabel}.</strong>}
          </p>
        )}
      </div>
    </section>
  );
}
