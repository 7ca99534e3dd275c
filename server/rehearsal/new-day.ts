import { v7 as uuidv7 } from 'uuid';
import { serviceDay } from '@/lib/time/service-day';
import { changeMeet } from '@/server/commands/meet/change';
import { addProof } from '@/server/commands/proof/add';
import { testerToday } from '@/server/queries/tester/standing';
import { daysOf } from './place';
import { settingOf } from './setting';
import { runner, type Stage } from './stage';
import { CAST_TESTERS } from './testers';

/**
 * Opens a rehearsal of an earlier day again: a meet that is over goes on until tomorrow, and each
 * tester is proved for today, as a lead would do it. A locked tester stays locked.
 */
export async function openNewDay(stage: Stage): Promise<void> {
  const now = stage.clock();
  const run = runner(stage, uuidv7);
  const { meet, benches, lead } = await settingOf(stage.db);
  if (serviceDay(now, meet.timeZone, meet.dayStartHour) > meet.endsOn) {
    const { name, place, timeZone, latitudeDeg, heightM, dayStartHour } = meet;
    const days = daysOf(now, dayStartHour);
    await run(changeMeet, lead, {
      meetId: meet.id,
      details: { name, place, timeZone, latitudeDeg, heightM, dayStartHour, ...days },
    });
  }
  for (const { testerId } of benches) {
    const today = testerId ? await testerToday(stage.db, testerId, meet, now) : null;
    const cast = CAST_TESTERS.find(({ tester }) => tester.name === today?.tester.name);
    if (!testerId || !today || !cast || today.proof || today.tester.lockedReason) continue;
    const { at: _at, ...proof } = cast.proof;
    await run(addProof, lead, { ...proof, testerId });
  }
}
