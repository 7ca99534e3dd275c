import { expect, it } from 'vitest';
import pg from 'pg';
import { openStore } from './client';
import { staff } from './schema';

const url = process.env.TEST_DATABASE_URL;

it.runIf(url)('processes that start together on an empty database all find it ready', async () => {
  const admin = new pg.Client({ connectionString: url });
  await admin.connect();
  const name = `pullpost_start_${process.pid}`;
  await admin.query(`create database ${name}`);
  try {
    const own = new URL(url!);
    own.pathname = `/${name}`;
    const stores = await Promise.all(
      [1, 2, 3].map(() => openStore({ kind: 'postgres', url: own.href })),
    );
    for (const { db } of stores) expect(await db.select().from(staff)).toEqual([]);
    await Promise.all(stores.map((store) => store.close()));
  } finally {
    await admin.query(`drop database ${name} with (force)`);
    await admin.end();
  }
});
