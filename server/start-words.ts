import path from 'node:path';

/** What the system says of a folder that cannot be used, in words. */
const FOLDER: Record<string, string> = {
  EACCES: 'this user may not write there',
  EPERM: 'this user may not write there',
  EROFS: 'it is on a read-only disk',
  ENOENT: 'it does not exist and cannot be made',
  ENOTDIR: 'a part of that path is a file, not a folder',
  EEXIST: 'there is a file of that name',
  ENOSPC: 'the disk is full',
  EDQUOT: 'the disk space of this user is used up',
  EIO: 'the disk reports an error',
};

/** What the system says of an address that cannot be listened on, in words. */
const LISTEN: Record<string, string> = {
  EADDRINUSE: 'another program has it. Set PORT to a free one',
  EACCES: 'this user may not use it. Set PORT to 1024 or above',
  EADDRNOTAVAIL: 'this machine has no such address. Set HOST to one that it has, or leave it out',
  ENOTFOUND: 'no machine has that name. Set HOST to an address of this one, or leave it out',
};

/** What happens on the way to a database server, in words. */
const CONNECT: Record<string, string> = {
  ECONNREFUSED: 'nobody answers there',
  ENOTFOUND: 'no machine has that name',
  EAI_AGAIN: 'the name cannot be looked up',
  ETIMEDOUT: 'nobody answers there',
  '28P01': 'the name or the password is wrong',
  '28000': 'this user may not connect',
  '3D000': 'it has no such database',
};

/** Is the file of this error in the folder, or on the way to it? One that names no file may be. */
function concerns(error: NodeJS.ErrnoException, dataDir: string): boolean {
  if (error.path === undefined) return true;
  const at = path.resolve(error.path);
  return at.startsWith(dataDir) || dataDir.startsWith(at);
}

/**
 * An error at start in one line that a person can act on; null for one that has to keep its stack.
 * `where` is what the configuration says.
 */
export function startWords(
  error: unknown,
  where: { dataDir: string; host: string; port: number; hasDatabaseUrl: boolean },
): string | null {
  if (!(error instanceof Error)) return null;
  const { code, syscall }: NodeJS.ErrnoException = error;
  if (code === 'data-folder-locked' || error.message.startsWith('The configuration')) {
    return error.message;
  }
  if (code === undefined) return null;
  if (syscall === 'listen' || (syscall === 'getaddrinfo' && !where.hasDatabaseUrl)) {
    const why = LISTEN[code];
    return why ? `Port ${where.port} of ${where.host} cannot be opened (${code}): ${why}.` : null;
  }
  if (where.hasDatabaseUrl) {
    const why = CONNECT[code];
    return why
      ? `The database server of DATABASE_URL cannot be used (${code}): ${why}. Start it, or correct the address.`
      : null;
  }
  const why = concerns(error, where.dataDir) ? FOLDER[code] : undefined;
  return why
    ? `The data folder ${where.dataDir} cannot be used (${code}): ${why}. Set PULLPOST_DATA to a folder that this user can write.`
    : null;
}
