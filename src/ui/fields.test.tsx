import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { CheckboxGroup, RadioCards } from './choices';
import { Select, TextInput } from './text-inputs';

/** Value of an attribute of the first element of a kind. */
function attribute(markup: string, element: string, name: string): string | undefined {
  return markup.match(new RegExp(`<${element}[^>]*? ${name}="([^"]*)"`))?.[1];
}

describe('TextInput', () => {
  const markup = renderToStaticMarkup(<TextInput label="Height" name="height" hint="In feet" error="50 ft or less" />);

  it('ties label, hint and error to the input', () => {
    const id = attribute(markup, 'input', 'id');
    expect(attribute(markup, 'label', 'for')).toBe(id);
    expect(attribute(markup, 'input', 'aria-invalid')).toBe('true');
    const described = attribute(markup, 'input', 'aria-describedby')?.split(' ') ?? [];
    expect(described).toHaveLength(2);
    for (const part of described) expect(markup).toContain(`<p id="${part}"`);
  });

  it('claims no error where there is none', () => {
    const plain = renderToStaticMarkup(<TextInput label="Height" name="height" />);
    expect(plain).not.toContain(' aria-invalid=');
    expect(plain).not.toContain(' aria-describedby=');
  });
});

describe('Select', () => {
  it('keeps the chosen option and offers an empty first one', () => {
    const options = [
      { value: 'a', label: 'Ladder' },
      { value: 'b', label: 'Box blind' },
    ];
    const markup = renderToStaticMarkup(
      <Select label="Kind" placeholder="Choose" options={options} defaultValue="b" />,
    );
    expect(markup).toContain('<option value="">Choose</option>');
    expect(markup).toMatch(/<option value="b" selected="">/);
  });
});

describe('choices', () => {
  const choices = [
    { value: 'bow', label: 'Bow' },
    { value: 'rifle', label: 'Rifle' },
  ];

  it('marks those chosen at first under one legend', () => {
    const markup = renderToStaticMarkup(
      <CheckboxGroup label="Weapons" name="weapons" choices={choices} defaultValue={['rifle']} />,
    );
    expect(markup).toContain('<legend');
    expect(markup.match(/checked=""/g)).toHaveLength(1);
    expect(markup).toMatch(/<input[^>]*checked=""[^>]*value="rifle"|<input[^>]*value="rifle"[^>]*checked=""/);
  });

  it('leaves every card unmarked when nothing is chosen', () => {
    const markup = renderToStaticMarkup(<RadioCards label="Weapon" name="weapon" choices={choices} />);
    expect(markup).not.toContain('checked=""');
    expect(markup.match(/type="radio"/g)).toHaveLength(2);
  });
});
