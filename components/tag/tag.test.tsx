import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { PullDots } from '../pull-dots';
import { Tag, TagPage } from './tag';

describe('Tag', () => {
  it('has a peg only when it hangs', () => {
    expect(renderToStaticMarkup(<Tag code="A27" hangs />)).toContain('tag-peg');
    expect(renderToStaticMarkup(<Tag code="A27" />)).not.toContain('tag-peg');
    expect(renderToStaticMarkup(<TagPage hangs>page</TagPage>)).toContain('tag-peg');
  });

  it('takes the height of its capitals from the caller', () => {
    const html = renderToStaticMarkup(<Tag code="A27" size="board" capHeight="119px" />);
    expect(html).toContain('--tag-cap:119px');
  });

  it('escapes what it is given', () => {
    expect(renderToStaticMarkup(<Tag code="A27" line="<b>" />)).toContain('&lt;b&gt;');
  });
});

describe('PullDots', () => {
  it('says in words how many are taken', () => {
    const html = renderToStaticMarkup(<PullDots taken={9} total={15} />);
    expect(html).toContain('aria-label="9 of 15 readings taken"');
    expect(html.match(/bg-\(--dot\)/g)).toHaveLength(9);
    expect(html.match(/border-control/g)).toHaveLength(6);
  });
});
