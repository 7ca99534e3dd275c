import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { Corridor, type CorridorRow } from './corridor';

const base: CorridorRow = {
  label: '204',
  unitLabel: 'N·m',
  lower: -3.85,
  upper: 4.17,
  guardPercent: 0.5,
  readings: [
    { deviation: 1.5, beyond: false },
    { deviation: 4.6, beyond: true },
  ],
  mean: 3.05,
  meanExpanded: 0.4,
  words: 'delivers 3.1 % low',
};

const render = (rows: CorridorRow[], basis: 'reference' | 'set' = 'reference') =>
  renderToStaticMarkup(<Corridor rows={rows} basis={basis} />);

describe('Corridor', () => {
  it('draws a dot for a reading and a square on its corner for one beyond', () => {
    const html = render([base]);
    expect(html.match(/<circle /g)).toHaveLength(1);
    expect(html.match(/fill="#d55e00"/g)).toHaveLength(1);
  });

  it('prints the deviation itself, while the drawing is turned', () => {
    const html = render([base]);
    expect(html).toContain('+3.0\u00a0%');
    const labels = [...html.matchAll(/left:([\d.]+)%[^>]*>([^<]+)</g)].map((match) => ({
      left: Number(match[1]),
      text: match[2],
    }));
    const upper = labels.find((label) => label.text === '+4.17\u00a0%');
    const lower = labels.find((label) => label.text === '\u22123.85\u00a0%');
    expect(upper?.left).toBeLessThan(50);
    expect(lower?.left).toBeGreaterThan(50);
  });

  it('has the same data as a picture with a description and as a table', () => {
    const html = render([base]);
    expect(html).toContain('role="img"');
    const describedBy = /aria-describedby="([^"]+)"/.exec(html)?.[1];
    expect(html).toContain(`id="${describedBy}"`);
    expect(html).toContain('1 beyond the limits of \u22123.85\u00a0% and +4.17\u00a0%');
    expect(html).toContain('<td>+1.50\u00a0%, +4.60\u00a0% (beyond)</td>');
  });

  it('shows an empty band before the first reading', () => {
    const html = render([{ ...base, readings: [], mean: null, meanExpanded: null }]);
    expect(html).not.toContain('<circle');
    expect(html).toContain('fill="#f1e9d4"');
    expect(html).toContain('no reading yet');
  });

  it('has one axis for shared limits and one a row for differing ones', () => {
    const other = { ...base, label: '340', lower: -6, upper: 6 };
    const count = (html: string) => html.match(/class="corridor-axis /g)?.length;
    expect(count(render([base, { ...base, label: '340' }]))).toBe(1);
    expect(count(render([base, other]))).toBe(2);
  });

  it('heads the rows by direction only when the tool is pulled both ways', () => {
    expect(render([{ ...base, direction: 'cw' }])).not.toContain('corridor-heading');
    const both = render([
      { ...base, direction: 'cw' },
      { ...base, direction: 'ccw' },
    ]);
    expect(both.match(/class="corridor-heading/g)).toHaveLength(2);
    expect(both).toContain('>counter-clockwise</div>');
  });

  it('says that an excluded row is not counted', () => {
    const html = render([
      { ...base, lower: null, upper: null, guardPercent: null, excluded: true },
    ]);
    expect(html).toContain('>not counted</span>');
    expect(html).toContain('no tolerance here');
    expect(html).not.toContain('fill="#f1e9d4"');
  });

  it('escapes what it is given', () => {
    expect(render([{ ...base, words: '<script>' }])).not.toContain('<script>');
  });
});
