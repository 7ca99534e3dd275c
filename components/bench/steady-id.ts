/** A command that went out and has had no answer yet. */
export interface SentCommand {
  id: string;
  /** Its input as text, to know it again. */
  input: string;
}

/** The same input keeps the id it was sent under; another input gets a new one. */
export function steadyId(
  before: SentCommand | null,
  input: unknown,
  newId: () => string,
): SentCommand {
  const text = JSON.stringify(input);
  return before?.input === text ? before : { id: newId(), input: text };
}
