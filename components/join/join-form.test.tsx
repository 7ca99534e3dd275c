import { readFileSync } from 'node:fs';
import path from 'node:path';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { isFixedTool } from '@/lib/torque/tool';
import { VISITOR_TOOL_KINDS } from '@/lib/torque/visitor-kinds';
import { emptyJoin, type JoinState } from './fields';
import { JoinForm } from './join-form';

const options = VISITOR_TOOL_KINDS.map(({ value, label }) => ({ value, label }));

const htmlOf = (state: Partial<JoinState> = {}, ticket = '') =>
  renderToStaticMarkup(
    <JoinForm
      action={async (before) => before}
      initial={{ ...emptyJoin(), ...state }}
      commandId="01900000-0000-7000-8000-990000000001"
      meetId="meet-1"
      ticket={ticket}
      kinds={{ common: options.slice(0, 5), more: options.slice(5) }}
      units={[{ value: 'N.m', label: 'N·m' }]}
    />,
  );

const values = (change: Partial<JoinState['values']>) => ({ ...emptyJoin().values, ...change });

describe('JoinForm', () => {
  it('carries the id of its command, so that sent twice it joins once', () => {
    expect(htmlOf()).toContain('name="commandId" value="01900000-0000-7000-8000-990000000001"');
    expect(htmlOf({ commandId: 'another' })).toContain('name="commandId" value="another"');
  });

  it('chooses nothing for the visitor', () => {
    expect(htmlOf()).not.toContain('checked=""');
  });

  it('keeps what was typed and ties each error to its field', () => {
    const html = htmlOf({
      values: values({ rangeMin: '34"0', kind: 'dial' }),
      errors: { rangeMin: 'Too large.' },
      attempt: 1,
    });
    expect(html).toContain('value="34&quot;0"');
    expect(html).toMatch(/checked=""[^>]*value="dial"|value="dial"[^>]*checked=""/);
    expect(html).toContain('aria-describedby="rangeMin-error"');
    expect(html).toContain('id="rangeMin-error"');
    expect(html).toContain('href="#rangeMin"');
  });

  it('opens a fold that holds something wrong, or the chosen kind', () => {
    expect(htmlOf()).not.toContain('<details open');
    expect(htmlOf({ errors: { email: 'No.' } }).match(/<details open/g)).toHaveLength(1);
    expect(htmlOf({ values: values({ kind: 'not-sure' }) })).toContain('<details open');
  });

  it('does not ask again who the visitor is', () => {
    expect(htmlOf()).toContain('name="email"');
    expect(htmlOf({}, 'ticket-token')).not.toContain('name="email"');
  });

  it('knows every kind that has one fixed value', () => {
    const css = readFileSync(path.join(import.meta.dirname, 'join.module.css'), 'utf8');
    for (const kind of VISITOR_TOOL_KINDS) {
      expect(css.includes(`[value='${kind.value}']`)).toBe(isFixedTool(kind.toolClass));
    }
  });
});
