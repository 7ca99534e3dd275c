import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { ownPath } from '@/lib/desk/own-path';
import { currentStaff } from '@/server/access/current';
import { homeOf } from '@/server/access/home';
import { isSetUp } from '@/server/queries/staff/any';
import { getRuntime } from '@/server/runtime';
import { SignInForm } from './_components/sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

interface PageInput {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The staff's way in. Visitors never need it. */
export default async function SignInPage({ searchParams }: PageInput) {
  const { next } = await searchParams;
  const goOn = ownPath(typeof next === 'string' ? next : null);
  const person = await currentStaff();
  if (person) redirect(goOn ?? homeOf(person.role));
  if (!(await isSetUp(getRuntime().store.db))) redirect('/set-up');
  return (
    <main className="mx-auto flex min-h-dvh max-w-phone flex-col justify-center gap-6 px-5 py-10">
      <header>
        <h1 className="font-code text-5xl font-semibold">Sign in</h1>
        <p className="text-fore-quiet mt-1">
          For the staff of this post. To have a tool checked you need no account.
        </p>
      </header>
      <SignInForm next={goOn} />
    </main>
  );
}
