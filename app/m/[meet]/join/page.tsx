import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { v7 as uuidv7 } from 'uuid';
import { emptyJoin } from '@/components/join/fields';
import { JoinClosed } from '@/components/join/join-closed';
import { JoinForm } from '@/components/join/join-form';
import { TORQUE_UNITS, unitText } from '@/lib/torque/units';
import { VISITOR_TOOL_KINDS } from '@/lib/torque/visitor-kinds';
import { meetBySlug } from '@/server/queries/meet/public';
import { ticketHolder } from '@/server/queries/ticket/holder';
import { getRuntime } from '@/server/runtime';
import { joinFromForm } from './actions';

interface JoinPageProps {
  params: Promise<{ meet: string }>;
  searchParams: Promise<{ ticket?: string | string[] }>;
}

const COMMON_KINDS = 5;

const kindOptions = VISITOR_TOOL_KINDS.map(({ value, label, help }) => ({
  value,
  label,
  hint: help,
}));
const kinds = { common: kindOptions.slice(0, COMMON_KINDS), more: kindOptions.slice(COMMON_KINDS) };
const units = TORQUE_UNITS.map((value) => ({ value, label: unitText(value) }));

export async function generateMetadata({ params }: JoinPageProps): Promise<Metadata> {
  const meet = await meetBySlug(getRuntime().store.db, (await params).meet);
  return { title: meet ? `Join the line at ${meet.name}` : 'Not found' };
}

/** One short form, and the visitor is in the line. */
export default async function JoinPage({ params, searchParams }: JoinPageProps) {
  const { store, secret } = getRuntime();
  const meet = await meetBySlug(store.db, (await params).meet);
  if (!meet) notFound();
  const { ticket } = await searchParams;
  const other = typeof ticket === 'string' ? await ticketHolder(store.db, ticket, secret) : null;
  if (!meet.joinOpen) {
    return <JoinClosed meet={meet} ticketPath={other && `/t/${ticket}`} />;
  }

  return (
    <main className="max-w-phone mx-auto flex flex-col gap-6 px-4 pt-6 pb-12">
      <header className="flex flex-col gap-2">
        <p className="text-fore-quiet">{meet.name}</p>
        <h1 className="font-code text-5xl leading-none font-bold">
          {other ? 'Add another tool' : 'Join the line'}
        </h1>
        <p>
          {other
            ? `It gets a tag of its own, beside ${other.code}, at the end of the line.`
            : 'A minute here, then a ticket that follows your tool. You can walk off and come back.'}
        </p>
        <p className="text-fore-quiet">
          We check what the tool does today. That is neither a calibration certificate nor a repair.
          Local rules and licensed practice come first.
        </p>
      </header>
      <JoinForm
        action={joinFromForm}
        initial={emptyJoin()}
        commandId={uuidv7()}
        meetId={meet.id}
        ticket={other ? String(ticket) : ''}
        kinds={kinds}
        units={units}
      />
    </main>
  );
}
