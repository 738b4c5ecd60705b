import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { answered } from '#web/features/order-wizard/testing/answered.ts';
import { orderBench } from './testing/order-bench.tsx';

const bench = orderBench();

describe('cutting cakes', () => {
  it('feed those whom the cake on show does not, in one press, and can be taken away again', async () => {
    const values = answered();
    values.day.headCount = 120;
    bench.keepDraft(values);
    const { user } = bench.open('/order/cake');
    const section = await screen.findByRole('region', { name: 'From the kitchen' });
    expect(await screen.findByText('Feeds 51 of 120.')).toBeVisible();

    await user.click(within(section).getByRole('button', { name: 'Add cutting cakes' }));
    // 69 are missing: three quarter sheets, cut 50 by 50 mm, feed 24 each.
    expect(within(section).getByLabelText('How many')).toHaveValue('3');
    expect(await screen.findByText('Feeds 123 of 120.')).toBeVisible();
    // They are of the cake’s own sponge and filling.
    expect(within(section).getByLabelText('Sponge')).toHaveValue('vanilla');

    await user.clear(within(section).getByLabelText('How many'));
    await user.type(within(section).getByLabelText('How many'), '4');
    expect(await screen.findByText('Feeds 147 of 120.')).toBeVisible();

    await user.click(within(section).getByRole('button', { name: 'Take these away' }));
    expect(await screen.findByText('Feeds 51 of 120.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(within(section).getByLabelText('How many')).toHaveValue('4'));
  });

  it('and the top tier is kept back with a cake whose other tiers feed everybody', async () => {
    const values = answered();
    values.day.headCount = 60;
    bench.keepDraft(values);
    const { user } = bench.open('/order/cake');
    const proposals = await screen.findByRole('group', { name: /we would bake one of these/ });
    const [first] = within(proposals).getAllByRole('radio');
    if (first === undefined) throw new Error('nothing is proposed');
    await user.click(first);
    await user.click(await screen.findByLabelText('Keep the top tier back for later'));
    await waitFor(() =>
      expect(
        within(proposals).getByRole('radio', { name: /the top one kept back/, checked: true }),
      ).toBeInTheDocument(),
    );
    expect(await screen.findByText(/^Feeds 6\d of 60\.$/)).toBeVisible();
  });
});
