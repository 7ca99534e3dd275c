import type { Metadata, Viewport } from 'next';
import { notFound } from 'next/navigation';
import { Board } from '@/components/board/board';
import { boardView } from '@/server/queries/board/view';
import { getRuntime } from '@/server/runtime';

export const metadata: Metadata = { title: 'Board' };
export const viewport: Viewport = { themeColor: '#26302e' };

export default async function BoardPage({ params }: { params: Promise<{ meet: string }> }) {
  const { meet } = await params;
  const { store, clock, origin } = getRuntime();
  const board = await boardView(store.db, meet, { origin, now: clock() });
  if (!board) notFound();
  return <Board initial={board.line} join={board.join} />;
}
