const STEP = /^(exercise pull|reading) (\d+) of (\d+) (.+)$/;

interface Run {
  kind: string;
  first: number;
  last: number;
  of: string;
  where: string;
}

const runWords = ({ kind, first, last, of, where }: Run): string =>
  first === last
    ? `${kind} ${first} of ${of} ${where}`
    : `${kind}s ${first} to ${last} of ${of} ${where}`;

/**
 * What a check misses, as few lines as tell it: 'readings 2 to 5 of 5 at 200 N·m clockwise' for one
 * after another. A line of another shape stays as it is.
 */
export function missingWords(lines: readonly string[]): string[] {
  const told: (Run | string)[] = [];
  for (const line of lines) {
    const [, kind, place, of, where] = STEP.exec(line) ?? [];
    if (kind === undefined || of === undefined || where === undefined) {
      told.push(line);
      continue;
    }
    const run = { kind, first: Number(place), last: Number(place), of, where };
    const before = told.at(-1);
    const goesOn =
      typeof before === 'object' &&
      before.kind === kind &&
      before.where === where &&
      before.of === of &&
      before.last + 1 === run.first;
    if (goesOn) before.last = run.last;
    else told.push(run);
  }
  return told.map((one) => (typeof one === 'string' ? one : runWords(one)));
}
