import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { verdictWord, type VerdictName } from './verdict';
import { VerdictHeading, VerdictMark } from './verdict-mark';

const names: VerdictName[] = ['within', 'outside', 'too-close', 'not-judged'];

describe('VerdictMark', () => {
  it.each(names)('%s has its word beside a hidden shape', (verdict) => {
    const html = renderToStaticMarkup(<VerdictMark verdict={verdict} />);
    expect(html).toContain(verdictWord[verdict]);
    expect(html).toMatch(/<svg[^>]*aria-hidden="true"/);
  });

  it('draws four different shapes', () => {
    const drawings = names.map((verdict) =>
      renderToStaticMarkup(<VerdictMark verdict={verdict} words="same" />),
    );
    expect(new Set(drawings).size).toBe(4);
  });

  it('says what a short check says, and not the plain word', () => {
    const words = 'Within at 45 and 110 N·m (short check)';
    const html = renderToStaticMarkup(<VerdictHeading verdict="within" words={words} />);
    expect(html).toContain(`>${words}</h1>`);
    expect(html).not.toContain('Within tolerance');
  });
});
