'use client';

import { useEffect, useRef } from 'react';
import { comboOf, isCommand, type BenchAction, type FocusKind } from './keys';

const CONTROLS = 'button, a[href], summary, input[type="checkbox"], input[type="radio"]';

function focusKind(target: EventTarget | null): FocusKind {
  if (!(target instanceof HTMLElement)) return 'page';
  if (target.matches(CONTROLS)) return 'control';
  if (target.matches('[data-number]')) return 'number';
  return target.matches('input, textarea, select') ? 'typing' : 'page';
}

/** Binds the keys of these actions to the whole page. A key that is held down acts once. */
export function useKeys(actions: readonly BenchAction[]): void {
  const current = useRef(actions);
  useEffect(() => {
    current.current = actions;
  });
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.isComposing) return;
      const combo = comboOf(event);
      if (combo === null || !isCommand(combo, focusKind(event.target))) return;
      const action = current.current.find(({ key }) => key === combo);
      if (!action) return;
      event.preventDefault();
      if (!event.repeat && !action.disabled) action.run();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);
}
