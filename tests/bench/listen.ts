import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';

/** Listens on a free port of this machine and gives the address. */
export async function listen(http: Server): Promise<string> {
  await new Promise<void>((resolve) => http.listen(0, '127.0.0.1', resolve));
  return `http://127.0.0.1:${(http.address() as AddressInfo).port}`;
}
