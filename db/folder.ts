import { accessSync, constants, existsSync, mkdirSync, statSync } from 'node:fs';
import path from 'node:path';

/**
 * Makes a folder and those above it. Node's own recursive mkdir never comes back where a file system
 * refuses new folders with ENOENT, as /proc does.
 * @throws an error of the system that says why it cannot be made, or not be written.
 */
export function makeFolder(folder: string): void {
  make(path.resolve(folder));
  // Said here, with a code: PGlite would end on it with words of its own.
  accessSync(folder, constants.R_OK | constants.W_OK | constants.X_OK);
}

function make(folder: string): void {
  const above = path.dirname(folder);
  try {
    mkdirSync(folder);
  } catch (error) {
    if (existsSync(folder) && statSync(folder).isDirectory()) return;
    const { code } = error as NodeJS.ErrnoException;
    if (code !== 'ENOENT' || above === folder || existsSync(above)) throw error;
    make(above);
    mkdirSync(folder);
  }
}
