import type { Reader } from '@/db/client';
import { staff } from '@/db/schema';

/** Has the post been set up: is there anybody who could sign in? */
export async function isSetUp(reader: Reader): Promise<boolean> {
  return (await reader.select({ id: staff.id }).from(staff).limit(1)).length > 0;
}
