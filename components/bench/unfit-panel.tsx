'use client';

import { useCommand } from '../live/use-command';
import { ReasonPanel } from './reason-panel';
import { dropDraft } from './start/draft';

/** Unsafe or impossible to check: the tool goes back unchecked, and the ticket says why. */
export function UnfitPanel({
  tag,
  onClose,
}: {
  tag: { id: string; code: string };
  onClose: () => void;
}) {
  const unfit = useCommand<{ tagId: string; reason: string }>('tag.mark-unfit');
  // The next start of this tag confirms everything anew.
  const done = () => {
    dropDraft(tag.id);
    onClose();
  };
  return (
    <ReasonPanel
      title={`${tag.code} cannot be checked`}
      label="Why? The visitor reads this on their ticket."
      usual={[
        'The head is cracked',
        'The ratchet slips',
        'The scale cannot be read',
        'No battery at hand',
        'Its maximum is above our tester’s',
      ]}
      submitLabel="Mark unfit"
      pending={unfit.isPending}
      error={unfit.error}
      onSubmit={(reason) => unfit.mutate({ tagId: tag.id, reason }, { onSuccess: done })}
      onClose={onClose}
    />
  );
}
