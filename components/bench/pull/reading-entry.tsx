'use client';

import clsx from 'clsx';
import { useEffect, useRef, type FormEvent, type KeyboardEvent, type RefObject } from 'react';
import type { CheckView } from '@/lib/live/contract';
import type { TorqueUnit } from '@/lib/torque/units';
import { Button } from '../../ui/button';
import { BigField } from './big-field';
import type { EntryNeeds } from './entry';
import { UnitChoice } from './unit-choice';
import type { Entry } from './use-entry';

/** The id of the tester's field, for the Enter that goes on to it. */
const TESTER_VALUE = 'tester-value';

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
  const doubted = entry.doubt !== null;
  const words = doubted ? 'Take it' : entry.unanswered ? 'Send again' : BUTTON_WORDS[needs.verb];
  const goesOn = needs.value && entry.text.toolValue !== '' && entry.text.value === '';
  const fields = Number(needs.value) + Number(needs.toolValue);
  return (
    <form
      onSubmit={submit}
      onKeyDown={onceOnly}
      noValidate
      className={clsx(
        'grid gap-3',
        fields === 1 ? 'grid-cols-[minmax(0,1fr)_auto]' : 'grid-cols-2',
      )}
    >
      {needs.toolValue && (
        <BigField
          id="tool-value"
          label={`Tool’s display, ${check.unitLabel}`}
          field={field}
          value={entry.text.toolValue}
          readOnly={entry.unanswered || entry.pending}
          invalid={entry.errors.toolValue !== undefined}
          onType={(typed) => entry.type('toolValue', typed)}
          onKeyDown={(event) => {
            // With the tester's value still to come, Enter goes on to it.
            if (event.key !== 'Enter' || !goesOn) return;
            event.preventDefault();
            event.currentTarget.form?.querySelector<HTMLInputElement>(`#${TESTER_VALUE}`)?.focus();
          }}
        />
      )}
      {needs.value && (
        <BigField
          id={TESTER_VALUE}
          label="Tester shows"
          aside={<UnitChoice unit={unit} onUnit={onUnit} />}
          field={needs.toolValue ? undefined : field}
          value={entry.text.value}
          readOnly={entry.unanswered || entry.pending}
          invalid={entry.errors.value !== undefined}
          onType={(typed) => entry.type('value', typed)}
        />
      )}
      <div
        className={clsx(
          'flex gap-2',
          fields !== 1 && 'col-span-2',
          fields === 1 && (doubted ? 'flex-col' : 'self-start pt-13.5'),
        )}
      >
        <Button
          ref={button}
          type="submit"
          size="big"
          wide
          pending={entry.pending}
          onKeyDown={onceOnly}
          className={doubted && fields === 1 ? 'min-h-14! py-1!' : 'min-h-17'}
        >
          {words}
        </Button>
        {doubted && (
          <Button
            variant="secondary"
            size="big"
            wide
            onClick={entry.retype}
            className={fields === 1 ? 'min-h-14! py-1!' : 'min-h-17'}
          >
            Retype
          </Button>
        )}
      </div>
    </form>
  );
}
