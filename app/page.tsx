import { redirect } from 'next/navigation';
import { connection } from 'next/server';
import { Pegboard } from '@/components/tag/pegboard';
import { TagPage } from '@/components/tag/tag';
import { buttonClass } from '@/components/ui/button';
import { meetsOnNow, type PublicMeet } from '@/server/queries/meet/public';
import { isSetUp } from '@/server/queries/staff/any';
import { getRuntime } from '@/server/runtime';

/** The front door: what this is, the meets that are on, and the way in for staff. */
export default async function FrontDoor() {
  await connection();
  const { store, clock, setupCode } = getRuntime();
  if (setupCode !== null && !(await isSetUp(store.db))) redirect('/set-up');
  const meets = await meetsOnNow(store.db, clock());
  return (
    <Pegboard className="flex min-h-dvh flex-col items-center px-4 py-10">
      <main className="max-w-phone flex w-full flex-col gap-8">
        <header className="flex flex-col gap-3">
          <h1 className="font-code text-6xl leading-none font-bold">Pullpost</h1>
          <p className="text-xl">
            Is your torque wrench telling the truth? Bring it to the post: we pull it on a reference
            tester while you watch, and you keep the record.
          </p>
        </header>
        {meets.now.map((meet) => (
          <MeetTag key={meet.id} meet={meet} />
        ))}
        {meets.now.length === 0 && <NothingOn coming={meets.coming} />}
      </main>
      <footer className="max-w-phone mt-auto w-full pt-10">
        <a href="/sign-in" className="inline-block py-3 underline underline-offset-4">
          Staff sign in
        </a>
      </footer>
    </Pegboard>
  );
}

function MeetTag({ meet }: { meet: PublicMeet }) {
  return (
    <section aria-label={meet.name}>
      <TagPage hangs>
        <p className="text-fore-quiet">On now</p>
        <h2 className="font-code text-4xl leading-none font-bold">{meet.name}</h2>
        <p className="text-fore-quiet mt-2">
          {meet.place}
          <br />
          {meet.days}
        </p>
        <div className="mt-6 flex flex-col gap-3">
          {meet.joinOpen ? (
            <a href={`/m/${meet.slug}/join`} className={buttonClass({ size: 'big', wide: true })}>
              Join the line
            </a>
          ) : (
            <p className="font-semibold">The line takes no new tools just now.</p>
          )}
          <a
            href={`/m/${meet.slug}/board`}
            className={buttonClass({ variant: 'secondary', wide: true })}
          >
            See the board
          </a>
        </div>
      </TagPage>
    </section>
  );
}

function NothingOn({ coming }: { coming: PublicMeet[] }) {
  return (
    <section aria-label="Meets" className="flex flex-col gap-2 text-xl">
      <p>No meet is on today.</p>
      {coming.map((meet) => (
        <p key={meet.id} className="text-fore-quiet">
          Next: {meet.name}, {meet.place}, {meet.days}
        </p>
      ))}
    </section>
  );
}
