import type { CheckView } from '@/lib/live/contract';
import type { BenchAction } from '../keys';
import type { CheckPanel } from './check-panels';
import type { EntryNeeds } from './entry';
import type { Entry } from './use-entry';

interface PullActionsInput {
  check: Pick<CheckView, 'offered' | 'paused' | 'pulls' | 'setting' | 'step'>;
  needs: EntryNeeds | null;
  entry: Pick<Entry, 'doubt' | 'submit' | 'retype' | 'pending' | 'unanswered' | 'text'>;
  isSimulated: boolean;
  /** The tester sends its values without being typed. */
  sendsItself: boolean;
  typesInstead: boolean;
  busy: boolean;
  open: (panel: CheckPanel) => void;
  onPause: () => void;
  onSimulate: () => void;
  onTypeInstead: () => void;
}

/** Everything that can be done in the middle of the pulls, in the order of the key bar. */
export function pullActions(input: PullActionsInput): BenchAction[] {
  const { check, needs, entry, busy, open } = input;
  const isReading = (check.offered ?? check.step)?.kind === 'reading';
  const isTyped = entry.text.value !== '' || entry.text.toolValue !== '';
  // Nothing is taken while it is paused: Enter goes on.
  const goesOn = check.paused && !check.offered;
  const actions: (BenchAction | false)[] = [
    goesOn && { key: 'enter', label: 'go on', run: input.onPause, disabled: busy, keyOnly: true },
    needs !== null &&
      !goesOn && {
        key: 'enter',
        label: entry.doubt !== null ? 'take it all the same' : needs.verb,
        run: entry.submit,
        disabled: entry.pending,
      },
    {
      key: 'v',
      label: check.offered ? 'void' : 'void last',
      run: () => open({ kind: 'void', pullId: null }),
      disabled: check.pulls.every(({ state }) => state === 'voided'),
    },
    check.setting &&
      isReading && {
        key: 'r',
        label: 'did not let go',
        run: () => open({ kind: 'no-release' }),
        disabled: check.paused,
      },
    input.isSimulated && {
      key: 's',
      label: 'simulate',
      run: input.onSimulate,
      disabled: busy || check.paused || check.offered !== null,
    },
    input.sendsItself && {
      key: 't',
      label: input.typesInstead ? 'tester sends' : 'type it',
      run: input.onTypeInstead,
    },
    { key: 'n', label: 'note', run: () => open({ kind: 'note' }) },
    {
      key: 'p',
      label: check.paused ? 'go on' : 'pause',
      run: input.onPause,
      disabled: busy,
    },
    // What is typed is let go first: no second press of Esc ends a check by accident.
    isTyped || entry.doubt !== null
      ? { key: 'escape', label: 'retype', run: entry.retype, disabled: entry.unanswered }
      : { key: 'escape', label: 'stop early', run: () => open({ kind: 'stop' }) },
    { key: 'a', label: 'give up', run: () => open({ kind: 'abandon' }) },
    { key: '?', label: 'all keys', run: () => open({ kind: 'keys' }), atEnd: true },
  ];
  return actions.filter((action) => action !== false);
}
