import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { Button } from './button';
import { Notice } from './notice';

describe('Button', () => {
  it('submits only when asked to', () => {
    expect(renderToStaticMarkup(<Button>Go</Button>)).toContain('type="button"');
    expect(renderToStaticMarkup(<Button type="submit">Go</Button>)).toContain('type="submit"');
  });

  it('submits nothing more while pending, and stays focusable', () => {
    const html = renderToStaticMarkup(
      <Button type="submit" pending pendingLabel="Sending…">
        Join
      </Button>,
    );
    expect(html).toContain('type="button"');
    expect(html).toContain('aria-disabled="true"');
    expect(html).not.toContain(' disabled=');
    expect(html).toContain('Sending…');
    expect(html).not.toContain('Join');
  });
});

describe('Notice', () => {
  it('announces a problem at once and information in its turn', () => {
    expect(renderToStaticMarkup(<Notice kind="problem" title="No" />)).toContain('role="alert"');
    expect(renderToStaticMarkup(<Notice>Yes</Notice>)).toContain('role="status"');
  });
});
