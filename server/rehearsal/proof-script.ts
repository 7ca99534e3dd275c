import { addProof } from '@/server/commands/proof/add';
import type { Script } from './director';
import { CAST_TESTERS, type CastTester } from './testers';
import { ago, type Telling } from './told';

async function* proofScript(telling: Telling, bench: number, cast: CastTester): Script {
  const { at, ...proof } = cast.proof;
  yield ago(telling, at);
  const testerId = telling.setting.benches[bench]!.testerId!;
  await telling.run(addProof, telling.setting.lead, { ...proof, testerId });
}

/** The lead proves each tester, each in a script of its own. */
export const proofScripts = (telling: Telling): Script[] =>
  CAST_TESTERS.map((cast, bench) => proofScript(telling, bench, cast));
