import { redirect } from 'next/navigation';

/** The short address of a meet, as somebody would type it. */
export default async function MeetPage({ params }: { params: Promise<{ meet: string }> }) {
  redirect(`/m/${encodeURIComponent((await params).meet)}/join`);
}
