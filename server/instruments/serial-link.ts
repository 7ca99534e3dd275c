import type { Schedule } from './instrument';
import type { OpenedPort, OpenPort } from './open-port';

export interface SerialLinkOptions {
  path: string;
  baudRate: number;
  openPort: OpenPort;
  schedule: Schedule;
  onOpen(): void;
  onData(chunk: Uint8Array): void;
  /** The port is not open, for this reason in plain words; another try follows. */
  onDown(message: string): void;
}

/** Keeps one serial port open for as long as it is wanted. */
export interface SerialLink {
  start(): void;
  /** Resolves when the port is free. Nothing is called after `stop`. */
  stop(): Promise<void>;
}

/** Waits between tries to open: doubled from the first to the last. */
const FIRST_RETRY_MS = 500;
const LAST_RETRY_MS = 5000;

/**
 * Milliseconds between looks whether the device is still there. A read under way at the moment the
 * cable goes ends with no bytes, which the serialport package takes for 'try again', for ever.
 */
const PRESENCE_MS = 250;

/** A link for one start and one stop. */
export function createSerialLink(options: SerialLinkOptions): SerialLink {
  const { path, baudRate, openPort, schedule, onOpen, onData, onDown } = options;
  let wanted = false;
  let port: OpenedPort | null = null;
  let lastTry: Promise<void> = Promise.resolve();
  let cancelTimer = () => {};
  let retryMs = FIRST_RETRY_MS;

  function after(delayMs: number, run: () => void): void {
    cancelTimer();
    cancelTimer = schedule(run, delayMs);
  }

  function retry(message: string): void {
    const delayMs = retryMs;
    retryMs = Math.min(retryMs * 2, LAST_RETRY_MS);
    after(delayMs, attempt);
    onDown(message);
  }

  function attempt(): void {
    lastTry = openPort({ path, baudRate }).then(adopt, (error: unknown) => {
      if (wanted) retry(error instanceof Error ? error.message : String(error));
    });
  }

  async function adopt(opened: OpenedPort): Promise<void> {
    if (!wanted) return opened.close();
    port = opened;
    retryMs = FIRST_RETRY_MS;
    opened.onClose(() => drop(opened));
    opened.onData((chunk) => {
      if (port === opened) onData(chunk);
    });
    watch(opened);
    onOpen();
  }

  function watch(opened: OpenedPort): void {
    after(PRESENCE_MS, () => {
      void opened.isPresent().then((present) => {
        if (port !== opened) return;
        if (present) watch(opened);
        else drop(opened);
      });
    });
  }

  function drop(opened: OpenedPort): void {
    if (port !== opened) return;
    port = null;
    // The next try must not find the port still held by this one.
    lastTry = opened.close();
    retry(`The connection to ${path} is gone: the cable is out or the tester is off.`);
  }

  return {
    start() {
      wanted = true;
      attempt();
    },
    async stop() {
      wanted = false;
      cancelTimer();
      const open = port;
      port = null;
      await lastTry;
      await open?.close();
    },
  };
}
