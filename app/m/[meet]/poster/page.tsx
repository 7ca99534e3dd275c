import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { QrCode } from '@/components/board/qr-code';
import { joinAddress } from '@/server/queries/board/view';
import { meetBySlug } from '@/server/queries/meet/public';
import { getRuntime } from '@/server/runtime';
import { PrintButton } from './_components/print-button';
import './_components/poster.css';

export const metadata: Metadata = { title: 'Join poster' };

const STEPS = [
  'Scan, and say what tool you have. No account.',
  'Walk around. Your phone shows your place, the board shows your code.',
  'Come when you are called. Watch every pull, keep the result.',
];

/** The join poster of a meet: one A4 sheet to print and hang up. */
export default async function PosterPage({ params }: { params: Promise<{ meet: string }> }) {
  const { meet: slug } = await params;
  const { store, origin } = getRuntime();
  const meet = await meetBySlug(store.db, slug);
  if (!meet) notFound();
  const join = joinAddress(origin, slug);
  return (
    <>
      <aside
        aria-label="Printing"
        className="ground-wall flex flex-wrap items-center gap-4 px-5 py-3 print:hidden"
      >
        <p className="mr-auto">One sheet of A4, portrait. Hang it where people walk past.</p>
        <PrintButton />
      </aside>
      <main className="poster">
        <header>
          <p className="poster-meet">
            {meet.name} · {meet.place}
          </p>
          <h1 className="font-code poster-title font-bold">
            Is your torque wrench telling the truth?
          </h1>
        </header>
        <div className="poster-join">
          <QrCode drawing={join.qr} label="QR code of the address to join" className="poster-qr" />
          <ol className="poster-steps">
            {STEPS.map((step, index) => (
              <li key={step}>
                <span aria-hidden="true" className="font-code poster-number font-bold">
                  {index + 1}
                </span>
                <span>{step}</span>
              </li>
            ))}
          </ol>
        </div>
        <footer>
          <p className="font-reading poster-address">{join.text}</p>
          <p className="poster-small">
            Use the Wi-Fi of the post. An as-found check on the day: not a calibration certificate
            and not a repair. Your tool may be pulled up to its maximum, at your risk; you choose
            when you join.
          </p>
        </footer>
      </main>
    </>
  );
}
