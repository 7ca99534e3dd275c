import { notFound } from 'next/navigation';
import type { Permission } from '@/server/access/policy';
import { testerPage, type TesterPage } from '@/server/queries/testers/page';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../enter';

export interface TesterParams {
  params: Promise<{ tester: string }>;
}

/** The tester of a page below /desk/testers, for somebody who may see it; else 404. */
export async function loadTester(
  { params }: TesterParams,
  permission: Permission,
  below = '',
): Promise<TesterPage> {
  const { tester: testerId } = await params;
  await enterDesk(`/desk/testers/${testerId}${below}`, permission);
  const { store, clock, instruments } = getRuntime();
  const tester = await testerPage({ reader: store.db, now: clock(), instruments }, testerId);
  return tester ?? notFound();
}
