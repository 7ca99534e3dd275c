import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { cache } from 'react';
import { RecordPage } from '@/components/record/record-page';
import { recordOfToken } from '@/server/queries/record/by-token';
import { getRuntime } from '@/server/runtime';

interface ResultPageProps {
  params: Promise<{ token: string }>;
}

const readRecord = cache((token: string) => recordOfToken(getRuntime().store.db, token));

export async function generateMetadata({ params }: ResultPageProps): Promise<Metadata> {
  const record = await readRecord((await params).token);
  if (!record) return { title: 'Not found' };
  return { title: `${record.evaluation.statement} · ${record.tagCode} · ${record.number}` };
}

/** A signed-off check at its unguessable address. An unknown one says nothing. */
export default async function ResultPage({ params }: ResultPageProps) {
  const record = await readRecord((await params).token);
  if (!record) notFound();
  return <RecordPage record={record} />;
}
