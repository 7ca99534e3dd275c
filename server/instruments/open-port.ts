import { stat } from 'node:fs/promises';

/** An open serial port, cut down to what a link needs. */
export interface OpenedPort {
  onData(listener: (chunk: Uint8Array) => void): void;
  /** Called once when the port closes by itself, with the system's word for why. */
  onClose(listener: (reason: string) => void): void;
  /** Whether the path still leads to the device that was opened. */
  isPresent(): Promise<boolean>;
  /** Closes; resolves when the port is free. Closing a closed port is no error. */
  close(): Promise<void>;
}

export type OpenPort = (settings: { path: string; baudRate: number }) => Promise<OpenedPort>;

/**
 * Opens a serial port for this process alone. The serialport package is loaded here, at the first
 * opening, so that importing this file opens and loads nothing.
 * @throws Error whose message says in plain words why the port cannot be opened.
 */
export const openPort: OpenPort = async ({ path, baudRate }) => {
  const { SerialPort } = await import('serialport');
  const port = new SerialPort({ path, baudRate, lock: true, autoOpen: false });
  // Without a listener a late error of the stream would end the process.
  port.on('error', () => {});
  await new Promise<void>((resolve, reject) => {
    port.open((error) => (error ? reject(new Error(openingFault(path, error))) : resolve()));
  });
  const device = await deviceAt(path);

  return {
    onData: (listener) => port.on('data', listener),
    onClose: (listener) => {
      let told = false;
      const tell = (reason: string) => {
        if (!told) listener(reason);
        told = true;
      };
      port.once('close', (error?: Error | null) => tell(error?.message ?? 'closed'));
      port.once('error', (error: Error) => tell(error.message));
      port.once('end', () => tell('ended'));
    },
    // Where the system shows no file for a port there is nothing to compare.
    isPresent: async () => device === null || (await deviceAt(path)) === device,
    close: () => new Promise((resolve) => (port.isOpen ? port.close(() => resolve()) : resolve())),
  };
};

async function deviceAt(path: string): Promise<string | null> {
  try {
    const { dev, ino, rdev } = await stat(path);
    return `${dev}:${ino}:${rdev}`;
  } catch {
    return null;
  }
}

/** The package gives the system's text alone, no code: these are the texts of libc and Windows. */
export function openingFault(path: string, error: Error): string {
  const text = error.message;
  if (/no such (file|device)|ENOENT|ENXIO|ENODEV|file not found/i.test(text)) {
    return `There is no tester at ${path}. Is the cable in, and is the tester on?`;
  }
  if (/permission denied|not permitted|EACCES|EPERM/i.test(text)) {
    return `${path} may not be opened by this account. On Linux, add it to the group dialout.`;
  }
  if (/cannot lock|busy|temporarily unavailable|EBUSY|access denied/i.test(text)) {
    return `${path} is in use by another program. Close that program.`;
  }
  if (/ioctl|is a directory|not a tty|ENOTTY/i.test(text)) {
    return `${path} is not a serial port.`;
  }
  return `${path} cannot be opened (${text.replace(/^Error:?\s*/i, '')}).`;
}
