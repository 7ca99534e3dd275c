'use client';

import type { CheckView, TagView } from '@/lib/live/contract';
import type { TorqueUnit } from '@/lib/torque/units';
import { useCommand } from '../../live/use-command';
import { AbandonPanel } from '../abandon-panel';
import type { BenchAction } from '../keys';
import { ReasonPanel } from '../reason-panel';
import { KeysPanel } from './keys-panel';
import { NoReleasePanel } from './no-release-panel';
import { VoidPanel } from './void-panel';

/** What can be open beside a running check. */
export type CheckPanel =
  | { kind: 'void'; pullId: string | null }
  | { kind: 'note' }
  | { kind: 'stop' }
  | { kind: 'no-release' }
  | { kind: 'abandon' }
  | { kind: 'keys' };

interface CheckPanelsProps {
  panel: CheckPanel;
  check: CheckView;
  tag: TagView;
  unit: TorqueUnit;
  /** For the list of all keys. */
  actions: readonly BenchAction[];
  onClose: () => void;
}

/** The panel that is open, in the place of the corridor. */
export function CheckPanels({ panel, check, tag, unit, actions, onClose }: CheckPanelsProps) {
  switch (panel.kind) {
    case 'void':
      return <VoidPanel check={check} pullId={panel.pullId} onClose={onClose} />;
    case 'note':
      return <NotePanel check={check} onClose={onClose} />;
    case 'stop':
      return <StopPanel check={check} onClose={onClose} />;
    case 'no-release':
      return <NoReleasePanel check={check} unit={unit} onClose={onClose} />;
    case 'abandon':
      return <AbandonPanel tag={tag} onClose={onClose} />;
    case 'keys':
      return <KeysPanel actions={actions} onClose={onClose} />;
  }
}

function NotePanel({ check, onClose }: { check: CheckView; onClose: () => void }) {
  const note = useCommand<{ checkId: string; text: string }>('check.note');
  return (
    <ReasonPanel
      title="A note for the record"
      label="Note"
      submitLabel="Keep the note"
      maxLength={500}
      pending={note.isPending}
      error={note.error}
      onSubmit={(text) => note.mutate({ checkId: check.id, text }, { onSuccess: onClose })}
      onClose={onClose}
    >
      {check.notes.length > 0 && (
        <ul className="border-line max-h-40 overflow-y-auto border-b pb-2">
          {check.notes.map(({ at, text }) => (
            <li key={at + text}>{text}</li>
          ))}
        </ul>
      )}
    </ReasonPanel>
  );
}

function StopPanel({ check, onClose }: { check: CheckView; onClose: () => void }) {
  const stop = useCommand<{ checkId: string; reason: string }>('check.stop-early');
  return (
    <ReasonPanel
      title="Stop early: the record says so"
      label="Why"
      usual={['The visitor asked to stop', 'The tool is damaged', 'No time left']}
      submitLabel="Stop the pulls"
      pending={stop.isPending}
      error={stop.error}
      onSubmit={(reason) => stop.mutate({ checkId: check.id, reason }, { onSuccess: onClose })}
      onClose={onClose}
    >
      <p>{check.progressWords}. What is missing is named on the record, and you sign off next.</p>
    </ReasonPanel>
  );
}
