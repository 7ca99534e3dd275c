'use client';

import { useEffect, useRef, type FormEvent, type KeyboardEvent, type RefObject } from 'react';
import type { CheckView } from '@/lib/live/contract';
import { TORQUE_UNITS, unitText, type TorqueUnit } from '@/lib/torque/units';
import { Button } from '../../ui/button';
import { controlClass } from '../../ui/field';
import { Kbd } from '../../ui/kbd';
import { Notice } from '../../ui/notice';
import { NumberInput } from '../../ui/number-input';
import { ProblemNotice } from '../problem-notice';
import type { EntryNeeds } from './entry';
import type { Entry } from './use-entry';

interface ReadingEntryProps {
  check: CheckView;
  needs: EntryNeeds;
  entry: Entry;
  unit: TorqueUnit;
  onUnit: (unit: TorqueUnit) => void;
  /** The field that takes the next keys; the screen puts the focus back there. */
  field: RefObject<HTMLInputElement | null>;
}

const BUTTON_WORDS = { accept: 'Accept', take: 'Take it', done: 'Done' };

/** A key that is held down takes nothing twice. */
const onceOnly = (event: KeyboardEvent) => {
  if (event.key === 'Enter' && event.repeat) event.preventDefault();
};

/** The values of the pull in hand, and the one button that takes them. */
export function ReadingEntry(props: ReadingEntryProps) {
  const { check, needs, entry, unit, onUnit, field } = props;
  const hasField = needs.value || needs.toolValue;
  const button = useRef<HTMLButtonElement>(null);

  // A new pull: the hands go back to the wrench, the focus to where Enter takes the value.
  const pull = check.offered?.id ?? `${check.step?.index}`;
  useEffect(() => {
    const active = document.activeElement;
    if (active && active !== document.body && active.closest('section[aria-labelledby]')) return;
    (field.current ?? button.current)?.focus();
  }, [pull, hasField, field]);

  const submit = (event: FormEvent) => {
    event.preventDefault();
    entry.submit();
  };
  return (
    <form onSubmit={submit} onKeyDown={onceOnly} className="flex flex-col gap-3" noValidate>
      {needs.toolValue && (
        <NumberInput
          ref={field}
          data-number
          size="big"
          label="Tool’s display"
          unit={check.unitLabel}
          value={entry.text.toolValue}
          readOnly={entry.unanswered}
          error={entry.errors.toolValue}
          onChange={(event) => entry.type('toolValue', event.target.value)}
          onKeyDown={(event) => {
            // With the tester's value still to come, Enter goes on to it.
            if (event.key !== 'Enter' || !needs.value || entry.text.value !== '') return;
            event.preventDefault();
            event.currentTarget.form?.querySelector<HTMLInputElement>('#tester-value')?.focus();
          }}
          className="min-h-16 text-4xl"
        />
      )}
      {needs.value && (
        <div className="flex items-end gap-3">
          <NumberInput
            ref={needs.toolValue ? undefined : field}
            id="tester-value"
            data-number
            size="big"
            label="Tester shows"
            value={entry.text.value}
            readOnly={entry.unanswered}
            error={entry.errors.value}
            onChange={(event) => entry.type('value', event.target.value)}
            fieldClassName="flex-1 min-w-0"
            className="min-h-16 text-4xl"
          />
          <select
            aria-label="Unit of the tester’s display"
            value={unit}
            onChange={(event) => onUnit(TORQUE_UNITS.find((one) => one === event.target.value)!)}
            className={controlClass + ' min-h-16 max-w-26'}
          >
            {TORQUE_UNITS.map((one) => (
              <option key={one} value={one}>
                {unitText(one)}
              </option>
            ))}
          </select>
        </div>
      )}
      {entry.doubt !== null && (
        <Notice kind="problem" title={entry.doubt}>
          <Kbd>Enter</Kbd> again to take it, <Kbd>Esc</Kbd> to retype.
        </Notice>
      )}
      {entry.unanswered && (
        <Notice kind="problem" title="No answer from the post">
          What you typed is kept. <Kbd>Enter</Kbd> sends it again; it is never taken twice.
        </Notice>
      )}
      <ProblemNotice errors={[entry.refusal]} />
      <div className="flex gap-3">
        <Button
          ref={button}
          type="submit"
          size="big"
          wide
          pending={entry.pending}
          onKeyDown={onceOnly}
        >
          {entry.unanswered
            ? 'Send again'
            : entry.doubt !== null
              ? 'Take it all the same'
              : BUTTON_WORDS[needs.verb]}
        </Button>
        {entry.doubt !== null && (
          <Button variant="secondary" size="big" onClick={entry.retype}>
            Retype
          </Button>
        )}
      </div>
    </form>
  );
}
