'use client';

import { useState } from 'react';
import type { BenchSnapshot, TagView } from '@/lib/live/contract';
import { AbandonPanel } from './abandon-panel';
import { BarredNotice } from './bench-banners';
import { BenchFrame } from './bench-frame';
import type { BenchAction } from './keys';
import { START_FORM_ID, StartForm } from './start/start-form';
import { UnfitPanel } from './unfit-panel';

interface StartPhaseProps {
  tag: TagView;
  tool: NonNullable<BenchSnapshot['tool']>;
}

const submitForm = () => {
  const form = document.getElementById(START_FORM_ID);
  if (form instanceof HTMLFormElement) form.requestSubmit();
};
const leaveField = () => {
  if (document.activeElement instanceof HTMLElement) document.activeElement.blur();
};

/** A tool lies on the bench, and its check has not begun. */
export function StartPhase({ tag, tool }: StartPhaseProps) {
  const [panel, setPanel] = useState<'unfit' | 'abandon' | null>(null);
  const close = () => setPanel(null);
  const actions: BenchAction[] = panel
    ? [{ key: 'escape', label: 'close', run: close }]
    : [
        { key: 'ctrl+enter', label: 'start the check', run: submitForm },
        { key: 'u', label: 'mark unfit', run: () => setPanel('unfit') },
        { key: 'a', label: 'give the tool back unchecked', run: () => setPanel('abandon') },
        { key: 'escape', label: 'leave the field, for the keys', run: leaveField, atEnd: true },
      ];
  return (
    <BenchFrame actions={actions}>
      <div className="flex flex-col gap-4 empty:hidden [&>*]:mx-5 [&>*]:mt-5">
        <BarredNotice />
        {panel === 'unfit' && <UnfitPanel tag={tag} onClose={close} />}
        {panel === 'abandon' && <AbandonPanel tag={tag} onClose={close} />}
      </div>
      {/* Out of sight, but kept: nothing typed is lost. */}
      <div hidden={panel !== null}>
        <StartForm key={tag.id} tag={tag} tool={tool} />
      </div>
    </BenchFrame>
  );
}
