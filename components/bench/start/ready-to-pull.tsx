'use client';

import type { ToolDescription } from '@/lib/line/join';
import { CHECK_SCHEMES } from '@/lib/record/check-start';
import type { CommandError } from '../../live/use-command';
import { Button } from '../../ui/button';
import { Checkbox } from '../../ui/checkbox';
import { Fieldset } from '../../ui/fieldset';
import { Kbd } from '../../ui/kbd';
import { useBench } from '../bench-context';
import { ProblemNotice } from '../problem-notice';
import { Cautions } from './cautions';
import { fieldWords } from './field-words';
import { testerModeOf } from './form-values';
import { planWords, previewPlan } from './plan-preview';
import type { StartFormApi } from './start-schema';

interface ReadyToPullProps {
  form: StartFormApi;
  toolClass: string;
  /** The plate, once all of it can be read. */
  plate: ToolDescription | null;
  scheme: string;
  workingPoints: unknown;
  pending: boolean;
  error: CommandError | null;
}

const MODE_WORDS = {
  'first-peak': 'The tester is in its first-peak mode: this tool is set and lets go',
  live: 'The tester is in its live mode: this tool indicates while it is pulled',
};

const numbers = (value: unknown): number[] | null =>
  Array.isArray(value) && value.every((one) => Number.isFinite(one)) ? value : null;

/** The plan in words, the tester's mode, the cautions, and the start. */
export function ReadyToPull(props: ReadyToPullProps) {
  const { form, toolClass, plate, pending, error } = props;
  const { bench } = useBench();
  const { register, formState } = form;
  const mode = testerModeOf(toolClass);
  const scheme = CHECK_SCHEMES.find((known) => known === props.scheme) ?? 'standard';
  const workingPoints = numbers(props.workingPoints);
  const isReadable = plate !== null && (scheme !== 'working' || Boolean(workingPoints?.length));
  const preview =
    isReadable &&
    previewPlan({ tool: plate, scheme, workingPoints }, bench.meet.plan, bench.tester);

  return (
    <div className="flex min-w-0 flex-col gap-4">
      <section aria-live="polite" aria-label="The plan" className="bg-band px-4 py-3">
        {!preview && <p>The plan shows here once plate and working torques can be read.</p>}
        {preview && preview.ok && (
          <>
            {planWords(preview.plan, plate?.division ?? null).map((line) => (
              <p key={line}>{line}</p>
            ))}
            <p className="text-fore-quiet">
              {preview.plan.steps.length} pulls in all.
              {!preview.plan.isStandardSequence &&
                ' Not the standard’s sequence: the record says so.'}
            </p>
          </>
        )}
        {preview && !preview.ok && <p className="font-bold">{preview.words}</p>}
      </section>
      <Fieldset heading legend="Before the first pull">
        <Cautions
          toolMaximum={plate && { value: plate.rangeMax, unit: plate.unit }}
          tester={bench.tester}
          mode={mode}
        />
        <Checkbox
          {...register('cautionsSeen')}
          label={<strong>Read, and so it is</strong>}
          error={fieldWords(formState.errors, 'cautionsSeen')}
        />
        <Checkbox
          {...register('testerModeConfirmed')}
          label={
            <strong>{mode ? MODE_WORDS[mode] : 'The tester is in the mode for this tool'}</strong>
          }
          error={
            fieldWords(formState.errors, 'testerModeConfirmed') ??
            fieldWords(formState.errors, 'asFound.testerMode')
          }
        />
      </Fieldset>
      <ProblemNotice errors={[error]} />
      <Button type="submit" size="big" wide pending={pending} pendingLabel="Starting…">
        Start the check <Kbd>Ctrl+Enter</Kbd>
      </Button>
    </div>
  );
}
