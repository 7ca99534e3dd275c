import { MOVES_FROM } from '@/lib/line/machine';
import type { LineBench } from '@/lib/live/contract';
import type { LineRow } from './rows';

/** What a lead types into an action. All of it is text until the command has looked at it. */
export interface ActionField {
  name: string;
  label: string;
  hint?: string;
  kind: 'number' | 'text' | 'choice';
  options?: { value: string; label: string }[];
  initial?: string;
  isOptional?: boolean;
}

/** One thing that can be done with a tag now: a command, and what it asks for. */
export interface TagAction {
  command: string;
  title: string;
  submit: string;
  /** Said once it is done: 'A31 is held.' */
  done: string;
  fields: ActionField[];
  isGrave?: boolean;
  /** What goes with the tag's id, from the fields' text. */
  input: (values: Record<string, string>) => Record<string, unknown>;
}

const REASON: ActionField = {
  name: 'reason',
  label: 'Reason',
  hint: 'It stands in the ledger: no names, please.',
  kind: 'text',
};

/** A bench that can take the next tool: open, with nothing on it and nobody called to it. */
const isFree = (bench: LineBench): boolean =>
  bench.state === 'open' && bench.tag === null && bench.called === null;

function callAction(row: LineRow, benches: readonly LineBench[]): TagAction[] {
  const free = benches.filter(isFree);
  if (row.tag.state !== 'waiting' || row.isHeld || free.length === 0) return [];
  const { code } = row.tag;
  const isWithUs = row.tag.place !== 'visitor';
  return [
    {
      command: 'tag.call',
      title: isWithUs ? 'Take on a bench' : 'Call to a bench',
      submit: isWithUs ? `Take ${code} on the bench` : `Call ${code}`,
      done: isWithUs ? `${code} is on the bench.` : `${code} is called.`,
      fields: [
        {
          name: 'benchId',
          label: 'Bench',
          kind: 'choice',
          options: free.map(({ id, number }) => ({ value: id, label: `Bench ${number}` })),
          initial: free[0]!.id,
        },
      ],
      input: ({ benchId }) => ({ benchId }),
    },
  ];
}

/**
 * What can be done with a tag now, most usual first. The state machine has the last word: what
 * changed in the meantime is refused by the command, in words.
 */
export function tagActions(row: LineRow, benches: readonly LineBench[]): TagAction[] {
  const { tag } = row;
  const { code } = tag;
  const may = (move: keyof typeof MOVES_FROM): boolean => MOVES_FROM[move].includes(tag.state);
  const plain = (command: string, title: string, done: string): TagAction => ({
    command,
    title,
    submit: title,
    done,
    fields: [],
    input: () => ({}),
  });
  const actions = callAction(row, benches);
  if (may('return-to-line')) {
    actions.push(
      plain('tag.return-to-line', `Put ${code} back in the line`, `${code} waits again.`),
    );
  }
  if (may('mark-away')) {
    actions.push(
      plain('tag.mark-away', `Mark ${code} away`, `${code} is away; the bench is free.`),
    );
  }
  if (tag.state === 'waiting') {
    actions.push({
      command: 'tag.move',
      title: 'Move to another place',
      submit: `Move ${code}`,
      done: `${code} has moved.`,
      fields: [
        {
          name: 'place',
          label: 'New place',
          hint: '1 is next.',
          kind: 'number',
          initial: String(row.place ?? 1),
        },
        REASON,
      ],
      input: ({ place = '', reason }) => ({ place: Number(place), reason }),
    });
  }
  if (may('release') && tag.heldUntil !== null) {
    actions.push(plain('tag.release', `Release the hold of ${code}`, `${code} is no longer held.`));
  }
  if (may('hold')) {
    actions.push({
      command: 'tag.hold',
      title: tag.heldUntil === null ? 'Hold the turn' : 'Hold for another time',
      submit: `Hold ${code}`,
      done: `${code} is held.`,
      fields: [
        {
          name: 'minutes',
          label: 'Minutes from now',
          hint: 'It keeps its place and is passed over until then.',
          kind: 'number',
          initial: '15',
        },
      ],
      input: ({ minutes = '' }) => ({ minutes: Number(minutes) }),
    });
  }
  if (may('hang') && tag.place !== 'returned') {
    actions.push({
      command: 'tag.hang',
      title: tag.place === 'peg' ? 'Hang on another peg' : 'Hang the tool on a peg',
      submit: `Hang ${code}`,
      done: `${code} hangs on a peg.`,
      fields: [
        {
          name: 'peg',
          label: 'Peg',
          hint: 'Empty: the lowest free one.',
          kind: 'number',
          isOptional: true,
        },
      ],
      input: ({ peg = '' }) => ({ peg: peg.trim() === '' ? null : Number(peg) }),
    });
  }
  if (may('hand-back') && tag.place !== 'returned') {
    actions.push({
      command: 'tag.hand-back',
      title: 'Hand the tool back',
      submit: `Hand ${code} back`,
      done: `${code} is back with its owner.`,
      fields: [
        {
          name: 'ticketCode',
          label: 'Code on the visitor’s ticket',
          hint: 'Read it from their phone, not from the tag.',
          kind: 'text',
        },
      ],
      input: ({ ticketCode }) => ({ ticketCode }),
    });
  }
  if (may('mark-unfit')) {
    actions.push({
      command: 'tag.mark-unfit',
      title: 'Mark unfit for a check',
      submit: `Mark ${code} unfit`,
      done: `${code} is marked unfit.`,
      isGrave: true,
      fields: [{ ...REASON, hint: 'The visitor reads it on the ticket.' }],
      input: ({ reason }) => ({ reason }),
    });
  }
  if (may('withdraw')) {
    actions.push({
      ...plain('tag.withdraw', 'Withdraw from the line', `${code} has left the line.`),
      submit: `Withdraw ${code}`,
      isGrave: true,
    });
  }
  return actions;
}
