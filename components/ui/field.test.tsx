import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { Checkbox } from './checkbox';
import { NumberInput } from './number-input';
import { RadioCards } from './radio-cards';
import { Select } from './select';
import { TextInput } from './text-input';

/** Every id that the markup refers to must stand in it. */
function danglingReferences(html: string): string[] {
  const refs = [...html.matchAll(/(?:for|aria-describedby|aria-labelledby)="([^"]+)"/g)];
  return refs
    .flatMap((match) => (match[1] ?? '').split(' '))
    .filter((id) => !html.includes(` id="${id}"`));
}

const words = { label: 'Range', hint: 'As on the plate', error: 'Say a number.' };

describe('fields', () => {
  it.each([
    ['text', <TextInput key="t" {...words} name="a" />],
    ['number', <NumberInput key="n" {...words} name="a" unit="N·m" />],
    ['select', <Select key="s" {...words} name="a" options={[{ value: 'x', label: 'X' }]} />],
    ['checkbox', <Checkbox key="c" {...words} name="a" />],
  ])('%s ties hint and error to its control', (_kind, element) => {
    const html = renderToStaticMarkup(element);
    expect(html).toMatch(/aria-describedby="\S+-hint \S+-error"/);
    expect(html).toContain('aria-invalid="true"');
    expect(html).toContain('Say a number.');
    expect(danglingReferences(html)).toEqual([]);
  });

  it('has no empty references without hint and error', () => {
    const html = renderToStaticMarkup(<TextInput label="Name" name="name" />);
    expect(html).not.toContain('aria-describedby');
    expect(html).not.toContain('aria-invalid=');
  });

  it('asks for a number by a decimal keypad and keeps what was typed', () => {
    const html = renderToStaticMarkup(
      <NumberInput label="Reads" name="reads" defaultValue="12,5 or so" />,
    );
    expect(html).toContain('type="text"');
    expect(html).toContain('inputMode="decimal"');
    expect(html).toContain('value="12,5 or so"');
  });
});

describe('RadioCards', () => {
  const options = [
    { value: 'click', label: 'Click wrench' },
    { value: 'dial', label: 'Dial', hint: 'Shows while you pull' },
  ];

  it('is a group with one chosen', () => {
    const html = renderToStaticMarkup(
      <RadioCards
        legend="Kind"
        name="kind"
        options={options}
        defaultValue="dial"
        error="Choose."
      />,
    );
    expect(html).toContain('<legend');
    expect(html.match(/checked=""/g)).toHaveLength(1);
    expect(html).toMatch(/checked="" value="dial"|value="dial"[^>]*checked=""/);
    expect(danglingReferences(html)).toEqual([]);
  });
});
