import type { SerialConnection } from '@/lib/signal/connection';
import { createLineParser } from '@/lib/signal/line';
import { createLineSplitter, type SplitPiece } from '@/lib/signal/line-splitter';
import { createChannel } from './channel';
import type { Instrument, InstrumentProblem, InstrumentTime } from './instrument';
import { openPort as openSystemPort, type OpenPort } from './open-port';
import { createOpeningGuard } from './opening-guard';
import { createProblemLimiter } from './problem-limiter';
import { createSerialLink, type SerialLink } from './serial-link';

/** Characters of a line that a message quotes. */
const QUOTED_LENGTH = 40;

/**
 * A tester on a serial line that sends one line a pull. A lost port is tried again for ever; a line
 * cut by the loss is told as a problem and never joined to the next.
 * @throws RangeError when the line pattern cannot be used.
 */
export function createSerialInstrument(
  connection: SerialConnection,
  { now, schedule, openPort = openSystemPort }: InstrumentTime & { openPort?: OpenPort },
): Instrument {
  const { path, baudRate, linePattern, unit } = connection;
  const parse = createLineParser({ pattern: linePattern, unit });
  const channel = createChannel(now);
  const splitter = createLineSplitter();
  const limiter = createProblemLimiter((problem) => channel.emit('problem', problem), {
    now,
    schedule,
  });
  let link: SerialLink | null = null;

  function tell(code: InstrumentProblem['code'], raw: string, words: string): void {
    const problem = { code, message: `${quote(raw)} ${words}`, raw, at: now() };
    if (code === 'half-line') channel.emit('problem', problem);
    else limiter.tell(problem);
  }

  function take(piece: SplitPiece): void {
    if (piece.kind === 'too-long') {
      return tell('line-too-long', piece.text, 'is the start of a line far too long. Not taken.');
    }
    if (piece.kind === 'broken-off') {
      return tell('half-line', piece.text, 'broke off in the middle of a line. Repeat that pull.');
    }
    const parsed = parse(piece.text);
    if (!parsed.ok) {
      return tell('unreadable-line', piece.text, `was not taken: ${parsed.reason}.`);
    }
    const { valueNm, direction } = parsed;
    channel.emit('pull', { valueNm, direction, raw: piece.text.trim(), at: now() });
  }

  const guard = createOpeningGuard({
    schedule,
    onSettled(early, restless) {
      const cut = splitter.reset();
      if (restless) splitter.skipLine();
      const raw = [...early, cut].filter((text) => text.trim() !== '').join(' ');
      channel.become('ready', `Listening on ${path}.`);
      if (raw)
        tell('sent-while-opening', raw, 'came while the port was opening. Repeat that pull.');
    },
  });

  function dropHalfLine(): void {
    guard.stop();
    const half = splitter.reset();
    if (half.trim())
      tell('half-line', half, 'was cut off by the lost connection. Repeat that pull.');
    limiter.flush();
  }

  return {
    kind: 'serial',
    status: channel.status,
    on: channel.on,
    async attach() {
      if (link) return;
      channel.become('connecting', `Opening ${path}.`);
      link = createSerialLink({
        path,
        baudRate,
        openPort,
        schedule,
        onOpen: () => guard.start(),
        onData(chunk) {
          const pieces = splitter.push(chunk, now().getTime());
          if (guard.holds()) guard.keep(pieces.map((piece) => piece.text));
          else pieces.forEach(take);
        },
        onDown(message) {
          channel.become('lost', `${message} Trying again.`);
          dropHalfLine();
        },
      });
      link.start();
    },
    async detach() {
      const stopping = link;
      link = null;
      if (!stopping) return;
      const stopped = stopping.stop();
      dropHalfLine();
      await stopped;
      channel.become('detached', 'Not attached.');
    },
  };
}

function quote(raw: string): string {
  const shown = raw.trim().replace(/\p{Cc}/gu, '\u{fffd}');
  return `“${shown.length > QUOTED_LENGTH ? `${shown.slice(0, QUOTED_LENGTH)}…` : shown}”`;
}
