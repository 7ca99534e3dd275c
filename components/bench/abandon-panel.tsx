'use client';

import { useState } from 'react';
import { useCommand } from '../live/use-command';
import { RadioCards } from '../ui/radio-cards';
import { ReasonPanel } from './reason-panel';
import { dropDraft } from './start/draft';

interface AbandonPanelProps {
  tag: { id: string; code: string };
  onClose: () => void;
}

/** Gives the check up without a record: the tag waits again with its old place. */
export function AbandonPanel({ tag, onClose }: AbandonPanelProps) {
  const [to, setTo] = useState<'visitor' | 'peg'>('visitor');
  const abandon = useCommand<{ tagId: string; reason: string; to: 'visitor' | 'peg' }>(
    'check.abandon',
  );
  // The next start of this tag confirms everything anew.
  const done = () => {
    dropDraft(tag.id);
    onClose();
  };
  return (
    <ReasonPanel
      title={`Give up the check of ${tag.code}: no record`}
      label="Why"
      usual={['The visitor cannot stay', 'Wrong adapter at hand', 'The tester needs a look']}
      submitLabel="Give up the check"
      pending={abandon.isPending}
      error={abandon.error}
      onSubmit={(reason) => abandon.mutate({ tagId: tag.id, reason, to }, { onSuccess: done })}
      onClose={onClose}
    >
      <p>{tag.code} waits again with its old place. What was pulled stays in the post’s books.</p>
      <RadioCards
        legend="Where does the tool go?"
        name="abandon-to"
        columns={2}
        value={to}
        onChange={(event) => setTo(event.target.value === 'peg' ? 'peg' : 'visitor')}
        options={[
          { value: 'visitor', label: 'To its owner' },
          { value: 'peg', label: 'On a peg' },
        ]}
      />
    </ReasonPanel>
  );
}
