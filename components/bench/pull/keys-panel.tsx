'use client';

import { Kbd } from '../../ui/kbd';
import { BenchPanel } from '../bench-panel';
import { keyWords, type BenchAction } from '../keys';

/** Every key that does something now, and those that work inside a panel. */
export function KeysPanel({
  actions,
  onClose,
}: {
  actions: readonly BenchAction[];
  onClose: () => void;
}) {
  const all = [
    ...actions.map(({ key, label }) => ({ keys: keyWords(key), label })),
    { keys: '1 – 8', label: 'in “void”: the fault of the pull' },
    { keys: '← →', label: 'in “void”: an earlier or later pull' },
    { keys: 'Ctrl+Enter', label: 'sign off, once everything is taken' },
    { keys: 'Tab', label: 'the next field or button' },
  ];
  return (
    <BenchPanel title="All keys" onClose={onClose}>
      <dl className="grid gap-x-8 gap-y-2 sm:grid-cols-2">
        {all.map(({ keys, label }) => (
          <div key={keys + label} className="flex items-baseline gap-3">
            <dt className="w-28 shrink-0 text-right">
              <Kbd>{keys}</Kbd>
            </dt>
            <dd>{label}</dd>
          </div>
        ))}
      </dl>
    </BenchPanel>
  );
}
