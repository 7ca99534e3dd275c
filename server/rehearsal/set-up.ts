import type { Actor } from '@/server/access/actor';
import { setBenchTester } from '@/server/commands/bench/set-tester';
import { addCertificate } from '@/server/commands/certificate/add';
import { changeMeet } from '@/server/commands/meet/change';
import { setUpPost } from '@/server/commands/post/set-up';
import { addStaff } from '@/server/commands/staff/add';
import { addTester } from '@/server/commands/tester/add';
import { ACCOUNTS, CREW, hashFor, unknownPassword, type Account } from './accounts';
import { meetDetails, POST, siteDetails } from './place';
import { settingOf, type Setting } from './setting';
import type { Run, Stage } from './stage';
import { CAST_TESTERS, certificateInput } from './testers';

/** Sets the post up as its owner would: people, meet, benches, testers and their certificates. */
export async function setUp(stage: Stage, run: Run, opened: Date): Promise<Setting> {
  const { secret } = stage;
  const { name, login, password } = ACCOUNTS.owner;
  const { staffId, meetId } = await run(
    setUpPost,
    { kind: 'public' },
    {
      post: POST,
      owner: { name, login, passwordHash: await hashFor(secret, login, password) },
      meet: { ...meetDetails(opened), benches: CAST_TESTERS.length },
    },
  );
  const owner: Actor = { kind: 'staff', staffId, sessionVersion: 1 };
  const people: (Account & { password: string })[] = [
    ACCOUNTS.lead,
    ACCOUNTS.operator,
    ...CREW.map((member) => ({ ...member, password: unknownPassword(secret, member.login) })),
  ];
  for (const { password: words, ...person } of people) {
    const passwordHash = await hashFor(secret, person.login, words);
    await run(addStaff, owner, { ...person, passwordHash });
  }

  const { lead, benches } = await settingOf(stage.db);
  await run(changeMeet, lead, {
    meetId,
    details: { ...meetDetails(opened), ...siteDetails(opened) },
  });
  for (const [index, cast] of CAST_TESTERS.entries()) {
    const { testerId } = await run(addTester, lead, cast.tester);
    await run(addCertificate, lead, certificateInput(testerId, cast, opened));
    await run(setBenchTester, lead, { benchId: benches[index]!.id, testerId });
  }
  return settingOf(stage.db);
}
