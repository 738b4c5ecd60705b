import { screen, waitFor } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { answered } from '#web/features/order-wizard/testing/answered.ts';
import { orderBench } from './testing/order-bench.tsx';

const bench = orderBench();

function picture(name: string): File {
  return new File(['a picture'], name, { type: 'image/png' });
}

function uploaded(id: string) {
  return HttpResponse.json(
    {
      photo: {
        id,
        kind: 'inspiration',
        note: '',
        width: 800,
        height: 600,
        palette: ['#d9a0a8'],
        widths: [400, 800],
        createdAt: '2027-05-03T14:42:00Z',
      },
      claimKey: `claim-${id}`,
    },
    { status: 201 },
  );
}

describe('pictures to go by', () => {
  it('survive a lost connection, and are kept in the draft with their notes', async () => {
    let lost = true;
    bench.server.use(
      http.post('*/api/photos', () => (lost ? HttpResponse.error() : uploaded('photo-1'))),
    );
    bench.keepDraft(answered());
    const first = bench.open('/order/look');
    await first.user.upload(await screen.findByLabelText('Choose pictures'), picture('dress.png'));
    expect(await screen.findByText(/waiting for the connection/)).toBeVisible();

    lost = false;
    await first.user.click(screen.getByRole('button', { name: 'Try dress.png again' }));
    await first.user.type(await screen.findByLabelText(/What do you like about it/), 'The lace');
    await waitFor(() =>
      expect(bench.kept()).toMatchObject({
        values: {
          photos: [{ id: 'photo-1', claimKey: 'claim-photo-1', note: 'The lace' }],
        },
        pictures: { 'photo-1': { name: 'dress.png', palette: ['#d9a0a8'] } },
      }),
    );
    first.unmount();

    bench.open('/order/look');
    expect(await screen.findByLabelText(/What do you like about it/)).toHaveValue('The lace');
  });

  it('that are refused say why and stay until they are taken out', async () => {
    bench.server.use(
      http.post('*/api/photos', () =>
        HttpResponse.json(
          {
            type: 'about:blank',
            title: 'That file is not a picture we can read',
            status: 415,
            code: 'unreadable-photo',
            detail: 'It looks like text.',
          },
          { status: 415 },
        ),
      ),
    );
    bench.keepDraft(answered());
    const { user } = bench.open('/order/look');
    await user.upload(await screen.findByLabelText('Choose pictures'), picture('notes.png'));
    expect(await screen.findByText('notes.png: It looks like text.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Take notes.png out' }));
    await waitFor(() =>
      expect(screen.queryByText('notes.png: It looks like text.')).not.toBeInTheDocument(),
    );
  });

  it('are eight at most; what is over is said', async () => {
    let count = 0;
    bench.server.use(
      http.post('*/api/photos', () => {
        count += 1;
        return uploaded(`photo-${count}`);
      }),
    );
    bench.keepDraft(answered());
    const { user } = bench.open('/order/look');
    await user.upload(
      await screen.findByLabelText('Choose pictures'),
      Array.from({ length: 9 }, (_, at) => picture(`${at}.png`)),
    );
    expect(await screen.findByText(/8 pictures are the most; one was left out/)).toBeVisible();
    await waitFor(() =>
      expect(screen.getAllByLabelText(/What do you like about it/)).toHaveLength(8),
    );
    expect(count).toBe(8);
  });

  it('can be taken out and put back', async () => {
    bench.server.use(http.post('*/api/photos', () => uploaded('photo-1')));
    bench.keepDraft(answered());
    const { user } = bench.open('/order/look');
    await user.upload(await screen.findByLabelText('Choose pictures'), picture('dress.png'));
    await user.click(await screen.findByRole('button', { name: 'Take dress.png out' }));
    await user.click(await screen.findByRole('button', { name: 'Undo' }));
    expect(await screen.findByRole('button', { name: 'Take dress.png out' })).toBeVisible();
  });
});
