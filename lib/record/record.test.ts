import { describe, expect, it } from 'vitest';
import { evaluateCheck } from '@/lib/torque/check';
import { factsOf, pulled } from '@/lib/torque/check.fixture';
import { canonical } from './canonical';
import { parseRecord, RECORD_FORMAT, RECORD_VERSION, type SignedRecord } from './record';

const facts = pulled(factsOf({ scheme: 'iso-2003' }));
const evaluation = evaluateCheck(facts);

const record: SignedRecord = {
  format: RECORD_FORMAT,
  version: RECORD_VERSION,
  number: 'QM-2026-0147',
  post: { id: 'post-1', name: 'Quillmoor post', shortName: 'QM' },
  meet: {
    id: 'meet-1',
    name: 'Quillmoor Autumn Meet',
    place: 'Quillmoor',
    startsOn: '2026-10-09',
    timeZone: 'Europe/London',
  },
  checkId: 'check-1',
  tagCode: 'A31',
  toolId: 'tool-1',
  startedAt: '2026-10-09T13:40:00.000Z',
  signedAt: '2026-10-09T13:51:00.000Z',
  signedBy: { staffId: 'staff-1' },
  tool: {
    ...facts.tool,
    toolId: 'tool-1',
    nominal: null,
    measuresCcw: false,
    drive: '1/2 in',
    maker: null,
    serial: null,
  },
  asFound: {
    settingFound: 60,
    damage: '',
    battery: 'not-fitted',
    zeroShown: null,
    scale: 'N·m',
    head: '',
    testerMode: 'first-peak',
    temperatureC: 22,
  },
  plan: facts.plan,
  planVersion: 1,
  tester: {
    ...facts.tester,
    id: 'tester-1',
    name: 'T-01',
    maker: 'Invented',
    model: 'X',
    serial: '1',
  },
  certificate: {
    id: 'certificate-1',
    number: 'C-1',
    laboratory: 'Invented laboratory',
    accreditation: '0000',
    issuedOn: '2026-03-14',
    dueOn: '2027-03-14',
    traceability: 'Invented',
    correctionApplied: false,
  },
  proof: null,
  barred: [],
  temperatureC: 22,
  pulls: facts.pulls.map((pull, index) => ({
    ...pull,
    kind: facts.plan.steps[index]?.kind ?? 'reading',
    direction: 'cw',
    target: facts.plan.steps[index]?.target ?? 0,
    referenceNm: pull.rawNm,
    source: 'keyed',
    at: '2026-10-09T13:45:00.000Z',
  })),
  notes: [],
  evaluation,
  notFollowed: evaluation.notFollowed,
  stoppedEarly: false,
  stopReason: null,
  codeVersion: '0.1.0',
};

describe('parseRecord', () => {
  const text = canonical(record);
  it('gives back what was signed, infinite degrees of freedom as null', () => {
    const parsed = parseRecord(text);
    expect(canonical(parsed)).toBe(text);
    expect(parsed.evaluation.statement).toBe('Within tolerance');
    const components = parsed.evaluation.points[0]?.budget?.components ?? [];
    expect(components.find(({ name }) => name === 'certificate')?.dof).toBeNull();
    expect(components.find(({ name }) => name === 'repeatability')?.dof).toBe(4);
  });
  it('refuses what is no JSON, and what is another format or version', () => {
    expect(() => parseRecord('{')).toThrow(/no JSON/);
    expect(() => parseRecord('[]')).toThrow(RangeError);
    expect(() => parseRecord(canonical({ ...record, version: 2 }))).toThrow(/at version/);
    expect(() => parseRecord(canonical({ ...record, format: 'other' }))).toThrow(/at format/);
  });
  it('names the place that is wrong', () => {
    expect(() =>
      parseRecord(canonical({ ...record, evaluation: { ...evaluation, verdict: 'good' } })),
    ).toThrow(/at evaluation.verdict/);
    expect(() => parseRecord(canonical({ ...record, signedAt: 'yesterday' }))).toThrow(
      /at signedAt/,
    );
  });
  it('takes no name beside the id of the person who signed', () => {
    const signedBy = { staffId: 'staff-1', name: 'Somebody' };
    expect(() => parseRecord(canonical({ ...record, signedBy }))).toThrow(/at signedBy/);
  });
});
