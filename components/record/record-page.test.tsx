import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { SignedRecord } from '@/lib/record/record';
import { recordFixture } from './fixture';
import { RecordPage } from './record-page';

const htmlOf = (record: SignedRecord) => renderToStaticMarkup(<RecordPage record={record} />);
const textOf = (record: SignedRecord) =>
  htmlOf(record)
    .replace(/<[^>]+>/g, ' ')
    .replace(/\s+/g, ' ');
const heading = (html: string) => /<h1[^>]*>(.*?)<\/h1>/.exec(html)?.[1];

describe('RecordPage', () => {
  it('leads with the verdict and has one heading of the first rank', () => {
    const html = htmlOf(recordFixture());
    expect(heading(html)).toBe('Within tolerance');
    expect(html.match(/<h1/g)).toHaveLength(1);
    expect(html.match(/<main/g)).toHaveLength(1);
  });

  it('never says within alone for a short check', () => {
    const record = recordFixture({ plan: { scheme: 'short' } });
    const html = htmlOf(record);
    expect(heading(html)).toBe(record.evaluation.statement);
    expect(heading(html)).toMatch(/^Within at .*\(short check\)$/);
    expect(html).not.toContain('Within tolerance');
  });

  it('shows every reading with tool, tester and deviation', () => {
    // 204/200 − 1 = 2 % (ISO 6789-1: relative to the reference)
    const text = textOf(recordFixture({ rawNm: (nm) => (nm * 200) / 204 }));
    expect(text.match(/204 200\.0 \+2\.00 % delivers 2\.0 % low/g)).toHaveLength(5);
    expect(text).toContain('68 66.7 +2.00 %');
  });

  it('shows voided pulls with their reason, readings and exercise pulls alike', () => {
    const text = textOf(
      recordFixture({
        extraPulls: [
          { stepIndex: 5, state: 'voided', fault: 'knocked', note: 'dog', rawNm: 50 },
          { stepIndex: 0, state: 'voided', fault: 'slipped', rawNm: 300 },
        ],
      }),
    );
    expect(text).toContain('– 68 50.0 +36.00 % Voided: The bench or the tool was knocked (dog)');
    expect(text).toContain('340 N·m clockwise, tester 300.0. Voided: The drive slipped');
  });

  it('says by which torque a tool had not let go', () => {
    const record = recordFixture({
      rawNm: (nm, step) => (step === 5 ? nm * 1.3 : nm),
      change: {},
    });
    const stuck = {
      ...record,
      pulls: record.pulls.map((pull) =>
        pull.stepIndex === 5 ? { ...pull, outcome: 'no-release' as const } : pull,
      ),
    };
    expect(textOf(stuck)).toContain('68 88.4 did not let go by this torque');
  });

  it('names plan, departures, tester, certificate, proof, budget and both answers', () => {
    const text = textOf(recordFixture({ facts: { temperatureC: 9 } }));
    for (const words of [
      'ISO 6789:2003 sequence, version 3',
      'Ambient temperature 9 °C, outside 18 to 28 °C.',
      'Harrowgate HX 500',
      'C-2026-0117',
      '14 Mar 2027',
      'not corrected; its size is added to the uncertainty',
      'Passed with a dead weight',
      '9 Oct 2026, 08:10',
      'Tester’s certificate 0.150 % ∞',
      'Repeatability, mean of 5 0.000 % 4',
      'Reproducibility: no series was run.',
      'Without guard band',
      'Probability that the mean conforms',
      'Test uncertainty ratio',
      'Record QM-2026-0147',
      'It is not a calibration certificate and not a repair.',
      'A torque value is not a clamp load.',
    ]) {
      expect(text).toContain(words);
    }
  });

  it('shows the reference’s limits of the standard beside a claim', () => {
    const wide = recordFixture({
      facts: {
        tool: {
          toolClass: 'II-A',
          range: { min: 60, max: 340 },
          unit: 'N.m',
          division: 2,
          claim: { of: 'reading', cwPercent: 6, ccwPercent: null },
        },
      },
    });
    expect(textOf(wide)).toContain('Tolerance ±6 %, the maker’s claim The standard’s limits ±4 %');
  });

  it('says what barred a verdict, and renders without certificate and proof', () => {
    const record = recordFixture({
      facts: { barred: ['tester-out-of-date', 'not-proved-today'] },
      change: { certificate: null, proof: null },
    });
    const text = textOf(record);
    expect(heading(htmlOf(record))).toBe('Not judged');
    expect(text).toContain('the tester was not proved today');
    expect(text).toContain('none was valid');
  });

  it('escapes what people wrote', () => {
    expect(htmlOf(recordFixture())).toContain('Owner &lt;watched&gt;');
  });
});
