import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { answered } from '#web/features/order-wizard/testing/answered.ts';
import { fullDay, now, orderBench } from './testing/order-bench.tsx';

const bench = orderBench();

describe('the draft of an order', () => {
  it('is kept as it is typed and is there again on the next visit', async () => {
    const first = bench.open('/order/day');
    await first.user.type(await screen.findByLabelText('Number of people'), 'about 70');
    await first.user.click(screen.getByLabelText('Wedding'));
    await first.user.click(screen.getByRole('button', { name: 'Add an allergy' }));
    await first.user.selectOptions(await screen.findByLabelText('What is it?'), 'Egg');
    await waitFor(() =>
      expect(bench.kept()).toMatchObject({
        values: { day: { headCount: 70, occasionId: 'wedding', allergies: [{ allergen: 'egg' }] } },
      }),
    );
    first.unmount();

    bench.open('/order');
    expect(await screen.findByLabelText('Number of people')).toHaveValue('70');
    expect(screen.getByLabelText('Wedding')).toBeChecked();
    expect(await screen.findByLabelText('What is it?')).toHaveValue('egg');
  });

  it('takes no allergy for granted: what it is has to be chosen', async () => {
    const { user } = bench.open('/order/day');
    await user.click(await screen.findByRole('button', { name: 'Add an allergy' }));
    const which = await screen.findByLabelText('What is it?');
    expect(which).toHaveValue('');
    await user.click(screen.getByRole('button', { name: 'On to the cake' }));
    await waitFor(() => expect(which).toHaveAccessibleDescription(/Tell us what it is/));
    await user.selectOptions(which, 'Something else, in my words');
    expect(await screen.findByLabelText('Your words')).toHaveValue('');
  });

  it('opens where it was left, but never beyond what is missing', async () => {
    const values = answered();
    values.cake.coating = null;
    bench.keepDraft(values);
    bench.open('/order/check');
    expect(
      await screen.findByRole('heading', { level: 1, name: 'Where will it stand?' }),
    ).toBeVisible();
    expect(await screen.findByRole('alert')).toHaveTextContent('Choose what goes over the cake.');
  });

  it('can be begun anew, and that taken back', async () => {
    bench.keepDraft(answered());
    const { user } = bench.open('/order/you');
    const name = await screen.findByLabelText('Your name');
    expect(name).toHaveValue('Mara Quill');
    const [startOver] = screen.getAllByRole('button', { name: 'Start over', hidden: true });
    if (startOver === undefined) throw new Error('no way to start over');
    await user.click(startOver);
    await waitFor(() => expect(name).toHaveValue(''));
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(name).toHaveValue('Mara Quill'));
  });

  it('begins with a cake of the menu, and taking it back keeps what was typed since', async () => {
    const { user } = bench.open(
      '/order#sponge=chocolate&filling=raspberry&covering=buttercream&style=italian&allergen=egg',
    );
    expect(await screen.findByText(/Your cake from the menu is in the order/)).toBeVisible();
    await user.type(screen.getByLabelText('Number of people'), '40');
    await waitFor(() =>
      expect(bench.kept()).toMatchObject({
        values: { cake: { tiers: [{ spongeId: 'chocolate' }] }, day: { headCount: 40 } },
      }),
    );
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(screen.getByLabelText('Number of people')).toHaveValue('40');
    await waitFor(() =>
      expect(bench.kept()).toMatchObject({
        values: { cake: { tiers: [] }, day: { allergies: [], headCount: 40 } },
      }),
    );
  });

  it('offers a newer draft of another tab instead of writing over it', async () => {
    bench.keepDraft(answered());
    const { user } = bench.open('/order/you');
    await screen.findByLabelText('Your name');
    const other = answered();
    other.you.name = 'Written elsewhere';
    bench.keepDraft(other, now.getTime() + 60_000);
    window.dispatchEvent(
      new StorageEvent('storage', {
        key: bench.draftKey,
        newValue: localStorage.getItem(bench.draftKey),
      }),
    );
    expect(await screen.findByText(/changed in another tab/)).toBeVisible();
    await user.type(screen.getByLabelText('Your name'), ' the second');
    expect(bench.kept()).toMatchObject({ values: { you: { name: 'Written elsewhere' } } });
    await user.click(screen.getByRole('button', { name: 'Take the newer one' }));
    await waitFor(() =>
      expect(screen.getByLabelText('Your name')).toHaveValue('Written elsewhere'),
    );
  });
});

describe('going on', () => {
  it('lists what is missing, each leading to its field, and shortens the list as answers come', async () => {
    const { user } = bench.open('/order/day');
    await screen.findByLabelText('Number of people');
    await user.click(screen.getByRole('button', { name: 'On to the cake' }));
    const summary = await screen.findByRole('alert');
    expect(summary).toHaveFocus();
    expect(within(summary).getAllByRole('link')).toHaveLength(4);
    await user.click(within(summary).getByRole('link', { name: /how many people/i }));
    expect(screen.getByLabelText('Number of people')).toHaveFocus();
    await user.keyboard('12');
    await waitFor(() => expect(within(summary).getAllByRole('link')).toHaveLength(3));
    expect(screen.getByLabelText('Number of people')).toHaveValue('12');
  });

  it('goes back and forward without losing anything', async () => {
    bench.keepDraft(answered());
    const { user } = bench.open('/order/you');
    await user.type(await screen.findByLabelText(/^Telephone \(/), '607 555 0114');
    const [back] = screen.getAllByRole('link', { name: 'Back to the look' });
    if (back === undefined) throw new Error('no way back');
    await user.click(back);
    await screen.findByRole('heading', { level: 1, name: 'How should it look?' });
    await user.click(screen.getByRole('button', { name: 'On to you' }));
    expect(await screen.findByLabelText(/^Telephone \(/)).toHaveValue('607 555 0114');
  });

  it('applies advice in one press and takes it back in another', async () => {
    const values = answered();
    values.setting = {
      place: 'shade',
      warmestC: 27,
      minutesOut: 60,
      driveMinutes: 20,
      servedAt: null,
    };
    bench.keepDraft(values);
    const { user } = bench.open('/order/setting');
    const panel = await screen.findByRole('region', { name: 'Your cake so far' });
    const [way] = await within(panel).findAllByRole('button', { name: /Italian|Fondant|Ganache/ });
    if (way === undefined) throw new Error('no way out was offered');
    expect(await screen.findByRole('radio', { name: 'Swiss meringue' })).toBeChecked();
    await user.click(way);
    await waitFor(() =>
      expect(screen.queryByRole('radio', { name: 'Swiss meringue', checked: true })).toBeNull(),
    );
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() =>
      expect(screen.getByRole('radio', { name: 'Swiss meringue' })).toBeChecked(),
    );
  });

  it('says so before a choice loses the day, and takes the choice back when asked', async () => {
    bench.keepDraft(answered());
    const { user, client } = bench.open('/order/look');
    const words = await screen.findByLabelText(/^Bottom tier/);
    // The day stands for the cake as it is.
    await waitFor(() => expect(client.getQueriesData({ queryKey: ['dates'] })).not.toEqual([]));
    await waitFor(() => expect(client.isFetching()).toBe(0));
    bench.daysAre(fullDay);
    await user.type(words, 'Hi');
    expect(await screen.findByText(/cannot be ready for Saturday 19 June/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Take the change back' }));
    await waitFor(() => expect(words).toHaveValue(''));
  });
});
