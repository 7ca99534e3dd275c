import { chmodSync, mkdtempSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

export interface StartCase {
  name: string;
  env: Record<string, string>;
  /** Run as an account that owns nothing: permissions do not bind root. */
  asNobody: boolean;
  /** What the one line must say. */
  says: RegExp;
}

/** Ways in which a server cannot start, each with what it must say. Makes the folders they need. */
export function startCases(): StartCase[] {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'pullpost-start-'));
  const file = path.join(folder, 'a-file');
  writeFileSync(file, '');
  const isRoot = process.getuid?.() === 0;
  // Root hands the closed folder to somebody else; anybody else closes it to themselves.
  const closed = mkdtempSync(path.join(os.tmpdir(), 'pullpost-closed-'));
  chmodSync(closed, isRoot ? 0o755 : 0o555);
  const data = (dataDir: string) => ({ PULLPOST_DATA: dataDir });
  const cases: StartCase[] = [
    { name: 'a file is there', env: data(file), asNobody: false, says: /\(EEXIST\).*a file/ },
    {
      name: 'a file is on the way',
      env: data(path.join(file, 'below')),
      asNobody: false,
      says: /\(ENOTDIR\).*is a file/,
    },
    {
      name: 'the folder is not ours',
      env: data(closed),
      asNobody: isRoot,
      says: /\(EACCES\).*may not write/,
    },
    {
      name: 'the port is no number',
      env: { ...data(path.join(folder, 'never-made')), PORT: 'banana' },
      asNobody: false,
      says: /PORT: a port is a whole number/,
    },
  ];
  if (process.platform === 'linux') {
    // Where new folders are refused with ENOENT, Node's own recursive mkdir never comes back.
    cases.push({
      name: 'a place that takes no folders',
      env: data('/proc/nope/deeper'),
      asNobody: false,
      says: /\(ENOENT\).*cannot be made/,
    });
  }
  return cases;
}
