import { z } from 'zod';
import type { Reader } from '@/db/client';
import type { PlanSettings } from '@/lib/torque/settings';
import { meetById } from './list';

/** A meet as its form shows it. Torque and place in the units of the fields. */
export interface MeetDetails {
  id: string;
  slug: string;
  name: string;
  place: string;
  startsOn: string;
  endsOn: string;
  timeZone: string;
  dayStartHour: number;
  latitudeDeg: number | null;
  heightM: number | null;
  joinOpen: boolean;
  plan: PlanSettings;
}

/** The meet of an id from an address; null when it is none, or of no meet. */
export async function meetDetails(reader: Reader, meetId: string): Promise<MeetDetails | null> {
  if (!z.uuid().safeParse(meetId).success) return null;
  const meet = await meetById(reader, meetId);
  if (!meet) return null;
  const { id, slug, name, place, startsOn, endsOn, timeZone, dayStartHour } = meet;
  const { latitudeDeg, heightM, joinOpen, planSettings: plan } = meet;
  return {
    id,
    slug,
    name,
    place,
    startsOn,
    endsOn,
    timeZone,
    dayStartHour,
    latitudeDeg,
    heightM,
    joinOpen,
    plan,
  };
}
