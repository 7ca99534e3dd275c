'use client';

import clsx from 'clsx';
import type { MouseEvent } from 'react';
import { Kbd } from '../ui/kbd';
import { keyWords, type BenchAction } from './keys';
import { useKeys } from './use-keys';

/** A finger or a mouse leaves the focus where the keyboard wants it; the keyboard itself keeps it. */
const letGo = (event: MouseEvent<HTMLButtonElement>) => {
  if (event.detail > 0) event.currentTarget.blur();
};

/** The bottom line: every action with its key, each a button for a gloved finger. Binds the keys. */
export function KeyBar({ actions }: { actions: readonly BenchAction[] }) {
  useKeys(actions);
  const shown = actions.filter(({ keyOnly }) => !keyOnly);
  return (
    <footer>
      <div
        role="toolbar"
        aria-label="What you can do now"
        className="border-line flex min-h-16 flex-wrap items-center gap-x-1 border-t px-4 py-1"
      >
        {shown.map((action) => (
          <button
            key={action.key}
            type="button"
            aria-disabled={action.disabled || undefined}
            aria-keyshortcuts={keyWords(action.key)}
            onClick={(event) => {
              letGo(event);
              if (!action.disabled) action.run();
            }}
            className={clsx(
              'inline-flex min-h-13 items-center gap-2 rounded-lg px-2 whitespace-nowrap',
              'aria-disabled:cursor-default aria-disabled:opacity-60',
              action.atEnd && 'ml-auto',
            )}
          >
            <Kbd>{keyWords(action.key)}</Kbd> {action.label}
          </button>
        ))}
      </div>
    </footer>
  );
}
