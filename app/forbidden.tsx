import type { Metadata } from 'next';
import { ButtonLink } from '@/components/ui/button-link';

export const metadata: Metadata = { title: 'Not open to you' };

/** 403: signed in, but in another role. */
export default function Forbidden() {
  return (
    <main className="mx-auto flex min-h-dvh max-w-prose flex-col items-start justify-center gap-4 px-5 py-10">
      <h1 className="font-code text-5xl font-semibold">Not open to you</h1>
      <p>
        You are signed in, but your role cannot see this page. Ask a lead. Roles are given by the
        owner of the post.
      </p>
      <div className="flex flex-wrap gap-3">
        <ButtonLink href="/bench">To the benches</ButtonLink>
        <form method="post" action="/sign-out">
          <button
            type="submit"
            className="min-h-12 px-3 font-semibold underline underline-offset-4"
          >
            Sign in as somebody else
          </button>
        </form>
      </div>
    </main>
  );
}
