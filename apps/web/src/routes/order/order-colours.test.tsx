import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { answered } from '#web/features/order-wizard/testing/answered.ts';
import { orderBench } from './testing/order-bench.tsx';

const bench = orderBench();

/** A draft whose cake wears French buttercream, bright yellow by itself. */
function inFrench() {
  const values = answered();
  const { coating } = values.cake;
  if (coating === null) throw new Error('The answered order has no coat.');
  const french = { ...coating, covering: 'buttercream', style: 'french', colour: null } as const;
  return { ...values, cake: { ...values.cake, coating: french } };
}

describe('the color of the coat', () => {
  it('is shown as it comes out, with coats it comes nearer on and one press to take them', async () => {
    bench.keepDraft(inFrench());
    const { user } = bench.open('/order/look');
    const group = await screen.findByRole('group', { name: /Color of the coat/ });
    await user.click(within(group).getByRole('radio', { name: 'Morning sky, not on this base' }));
    expect(screen.getByText('Morning sky on French buttercream')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Change to it: Italian meringue' }));
    expect(await screen.findByText('Morning sky on Italian meringue buttercream')).toBeVisible();
    expect(screen.getByText('It comes out close to what you chose.')).toBeVisible();
    expect(within(group).getByRole('radio', { name: 'Morning sky' })).toBeChecked();
    await waitFor(() =>
      expect(bench.kept()).toMatchObject({
        values: { cake: { coating: { style: 'italian', colour: '#bcd7ea' } } },
      }),
    );
  });

  it('is taken by its figures, and deep ones say that they stain', async () => {
    bench.keepDraft(inFrench());
    const { user } = bench.open('/order/look');
    const own = await screen.findByRole('textbox', { name: 'Another color for the coat' });
    await user.clear(own);
    await user.type(own, 'navy');
    const around = within(screen.getByRole('group', { name: 'Another color for the coat' }));
    await user.click(around.getByRole('button', { name: 'Take it' }));
    expect(own).toBeInvalid();
    await user.clear(own);
    await user.type(own, '1F2A55');
    await user.click(around.getByRole('button', { name: 'Take it' }));
    expect(screen.getByRole('radio', { name: '#1f2a55' })).toBeChecked();
    // Said at the color at once, and beside the cake as soon as advice has been worked out.
    expect(screen.getAllByText(/Deep colors stain/)[0]).toBeVisible();
  });
});
