import { meets, posts } from '@/db/schema';
import { RECORD_FORMAT, RECORD_VERSION } from '@/lib/record/record';
import { evaluateCheck } from '@/lib/torque/check';
import { codeVersion } from '@/server/code-version';
import { factsOf, pullFact } from '@/server/queries/check/facts';
import type { CheckFile } from '@/server/queries/check/load';

interface Signing {
  number: string;
  now: Date;
  staffId: string;
  post: typeof posts.$inferSelect;
  meet: typeof meets.$inferSelect;
}

/** The self-contained content of a record: what its page and every export render, ids for people. */
export function signedRecord(file: CheckFile, { number, now, staffId, post, meet }: Signing) {
  const { check, tool, tester, certificate, proof } = file;
  const facts = factsOf(file);
  const evaluation = evaluateCheck(facts);
  return {
    format: RECORD_FORMAT,
    version: RECORD_VERSION,
    number,
    post: { id: post.id, name: post.name, shortName: post.shortName },
    meet: {
      id: meet.id,
      name: meet.name,
      place: meet.place,
      startsOn: meet.startsOn,
      timeZone: meet.timeZone,
    },
    checkId: check.id,
    tagCode: file.tag.code,
    toolId: tool.id,
    startedAt: check.startedAt.toISOString(),
    signedAt: now.toISOString(),
    signedBy: { staffId },
    tool: {
      ...facts.tool,
      toolId: tool.id,
      nominal: tool.nominal,
      measuresCcw: tool.measuresCcw,
      drive: tool.drive,
      maker: tool.maker,
      serial: tool.serial,
    },
    asFound: check.asFound,
    plan: check.plan,
    planVersion: check.planVersion,
    tester: {
      ...facts.tester,
      id: tester.id,
      name: tester.name,
      maker: tester.maker,
      model: tester.model,
      serial: tester.serial,
    },
    certificate: certificate && {
      id: certificate.id,
      number: certificate.number,
      laboratory: certificate.laboratory,
      accreditation: certificate.accreditation,
      issuedOn: certificate.issuedOn,
      dueOn: certificate.dueOn,
      traceability: certificate.traceability,
      correctionApplied: tester.correctionApplied,
    },
    proof: proof && {
      id: proof.id,
      method: proof.method,
      loadNm: proof.loadNm,
      readingNm: proof.readingNm,
      limitPercent: proof.limitPercent,
      at: proof.at.toISOString(),
      result: proof.result,
    },
    barred: facts.barred,
    temperatureC: facts.temperatureC,
    pulls: file.pulls.map((one) => {
      const step = check.plan.steps[one.pull.stepIndex]!;
      return {
        ...pullFact(check.plan, one),
        kind: step.kind,
        direction: step.direction,
        target: step.target,
        referenceNm: one.pull.rawNm === null ? null : one.pull.rawNm + one.pull.correctionNm,
        source: one.pull.source,
        at: one.pull.at.toISOString(),
      };
    }),
    notes: file.notes.map(({ text, at }) => ({ text, at: at.toISOString() })).reverse(),
    evaluation,
    notFollowed: evaluation.notFollowed,
    stoppedEarly: check.stoppedEarly,
    stopReason: check.stopReason,
    codeVersion: codeVersion(),
  };
}
