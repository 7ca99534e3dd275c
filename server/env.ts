import os from 'node:os';
import path from 'node:path';
import { z } from 'zod';

/** A variable that is set but blank counts as missing. */
const blankless = (env: NodeJS.ProcessEnv) =>
  Object.fromEntries(
    Object.entries(env).filter(([, value]) => value !== undefined && value.trim() !== ''),
  );

const PORT_WORDS = 'a port is a whole number from 0 to 65535';

const schema = z.object({
  NODE_ENV: z.enum(['development', 'production', 'test']).default('production'),
  PORT: z.coerce
    .number(PORT_WORDS)
    .int(PORT_WORDS)
    .min(0, PORT_WORDS)
    .max(65535, PORT_WORDS)
    .default(3000),
  HOST: z.string().default('0.0.0.0'),
  PULLPOST_ORIGIN: z.url().optional(),
  PULLPOST_DATA: z.string().default('.data/post'),
  PULLPOST_SECRET: z.string().min(32).optional(),
  DATABASE_URL: z.url().optional(),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
});

export interface Env {
  mode: 'development' | 'production' | 'test';
  port: number;
  host: string;
  /** What QR codes carry; null until the server listens, when the LAN address is taken. */
  origin: string | null;
  dataDir: string;
  secret: string | null;
  databaseUrl: string | null;
  logLevel: string;
}

/**
 * Reads the configuration once.
 * @throws Error that names each variable that cannot be used, and why.
 */
export function readEnv(source: NodeJS.ProcessEnv = process.env): Env {
  const parsed = schema.safeParse(blankless(source));
  if (!parsed.success) {
    const faults = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The configuration cannot be used: ${faults.join('; ')}.`);
  }
  const env = parsed.data;
  return {
    mode: env.NODE_ENV,
    port: env.PORT,
    host: env.HOST,
    origin: env.PULLPOST_ORIGIN?.replace(/\/+$/, '') ?? null,
    dataDir: path.resolve(env.PULLPOST_DATA),
    secret: env.PULLPOST_SECRET ?? null,
    databaseUrl: env.DATABASE_URL ?? null,
    logLevel: env.LOG_LEVEL,
  };
}

/** The machine's first LAN address (IPv4), or localhost when it has none. */
export function lanOrigin(port: number): string {
  const address = Object.values(os.networkInterfaces())
    .flat()
    .find((entry) => entry && entry.family === 'IPv4' && !entry.internal)?.address;
  return `http://${address ?? 'localhost'}:${port}`;
}
