import type { StartFormValues } from './form-values';

const keyOf = (tagId: string): string => `pullpost.start.${tagId}`;

/** What was typed for this tag before a reload; null when nothing was, or it cannot be read. */
export function readDraft(tagId: string): StartFormValues | null {
  try {
    const text = sessionStorage.getItem(keyOf(tagId));
    return text === null ? null : (JSON.parse(text) as StartFormValues);
  } catch {
    return null;
  }
}

/** Keeps what is typed until the check has started. A full or forbidden storage keeps nothing. */
export function keepDraft(tagId: string, values: StartFormValues): void {
  try {
    sessionStorage.setItem(keyOf(tagId), JSON.stringify(values));
  } catch {
    // The form itself still holds everything.
  }
}

export function dropDraft(tagId: string): void {
  try {
    sessionStorage.removeItem(keyOf(tagId));
  } catch {
    // Nothing was kept.
  }
}
