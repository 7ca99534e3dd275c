import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button-link';

export const metadata: Metadata = { title: 'Sign in first' };

/** 401: nobody is signed in, or the session has ended. */
export default function Unauthorized() {
  return (
    <main className="mx-auto flex min-h-dvh max-w-prose flex-col items-start justify-center gap-4 px-5 py-10">
      <h1 className="font-code text-5xl font-semibold">Sign in first</h1>
      <p>This page is for the staff of the post. If you were signed in, your session has ended.</p>
      <ButtonLink href="/sign-in">Sign in</ButtonLink>
    </main>
  );
}
