import { screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { formatLength, parseLength } from '#shared/kitchen/measures.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { NumberField } from './number-field.tsx';

function Width() {
  const [value, setValue] = useState<number | null>(null);
  return (
    <>
      <NumberField
        label="Width"
        value={value}
        onValue={setValue}
        read={(text) => parseLength(text, 'in')}
        write={(mm) => formatLength(mm, 'in')}
      />
      <output aria-label="Millimetres">{String(value)}</output>
      <button type="button">Elsewhere</button>
    </>
  );
}

describe('NumberField', () => {
  it.each([
    ['7 inches', '178', '7 in / 18 cm'],
    ['18cm', '180', '7 in / 18 cm'],
    ['10', '254', '10 in / 25 cm'],
  ])('takes %j for %s mm and shows %j once left', async (typed, value, shown) => {
    const { user } = renderAt('/', <Width />);
    await user.type(screen.getByLabelText('Width'), typed);
    expect(screen.getByLabelText('Width')).toHaveValue(typed);
    expect(screen.getByRole('status', { name: 'Millimetres' })).toHaveTextContent(value);
    await user.click(screen.getByRole('button'));
    expect(screen.getByLabelText('Width')).toHaveValue(shown);
  });

  it('keeps what it cannot read, and says NaN so that the contract can say why', async () => {
    const { user } = renderAt('/', <Width />);
    await user.type(screen.getByLabelText('Width'), 'as wide as a hat');
    await user.click(screen.getByRole('button'));
    expect(screen.getByLabelText('Width')).toHaveValue('as wide as a hat');
    expect(screen.getByRole('status', { name: 'Millimetres' })).toHaveTextContent('NaN');
  });

  it('is empty, not nought, when emptied', async () => {
    const { user } = renderAt('/', <Width />);
    await user.type(screen.getByLabelText('Width'), '7');
    await user.clear(screen.getByLabelText('Width'));
    expect(screen.getByRole('status', { name: 'Millimetres' })).toHaveTextContent('null');
  });
});
