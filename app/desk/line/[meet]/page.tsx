import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { DeskLine } from '@/components/desk/line/desk-line';
import { deskSnapshot } from '@/server/queries/desk/snapshot';
import { meetBySlug } from '@/server/queries/meet/public';
import { getRuntime } from '@/server/runtime';
import { enterDesk } from '../../enter';

export const metadata: Metadata = { title: 'Line' };

export default async function DeskLinePage({ params }: { params: Promise<{ meet: string }> }) {
  const { meet: slug } = await params;
  await enterDesk(`/desk/line/${slug}`);
  const { store, clock } = getRuntime();
  const meet = await meetBySlug(store.db, slug);
  const desk = meet ? await deskSnapshot(store.db, meet.id, clock()) : null;
  if (!desk) notFound();
  return <DeskLine key={desk.line.meetId} initial={desk} slug={slug} />;
}
