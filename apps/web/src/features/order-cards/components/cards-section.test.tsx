import { screen } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import type { OrderLabels } from '#shared/contracts/cards.ts';
import { labelFixture } from '#web/testing/label-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { CardsSection } from './cards-section.tsx';

const server = startApiServer();
const sentence = 'Gold sugar: its label does not settle soy.';

const stopped: OrderLabels = {
  labels: [labelFixture],
  reasons: [
    {
      code: 'unknown-allergen',
      sentence,
      ingredientId: 'gold-sugar',
      formulaId: null,
      confirmable: true,
    },
  ],
  reminders: ['Weigh the cake.'],
  unknownConfirmed: false,
  careCode: '7Q2M9XDK7Q2M9XDK',
  servedAt: null,
  can: { printLabels: false, printCareCard: true, confirmUnknown: true },
};

function open(labels: OrderLabels) {
  server.use(http.get('*/api/staff/orders/2421/labels', () => HttpResponse.json(labels)));
  return renderAt(
    '/staff/orders/2421',
    <CardsSection
      number={2421}
      locale="en-US"
      ingredientPath={(id) => `/staff/pantry/ingredients/${id}`}
      careCardPaper="half-letter"
    />,
  );
}

describe('labels on the order’s page', () => {
  it('say why they cannot be printed and print once the owner has answered for it', async () => {
    const sent: unknown[] = [];
    server.use(
      http.post('*/api/staff/orders/2421/labels/confirm-unknown', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({
          ...stopped,
          reasons: [],
          unknownConfirmed: true,
          can: { ...stopped.can, printLabels: true, confirmUnknown: false },
        });
      }),
    );
    const { user } = open(stopped);
    expect(await screen.findByText('No label can be printed yet')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Open it in the pantry' })).toHaveAttribute(
      'href',
      '/staff/pantry/ingredients/gold-sugar',
    );
    expect(screen.queryByRole('link', { name: 'Open the labels to print' })).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Print it as not known' }));
    const print = await screen.findByRole('link', { name: 'Open the labels to print' });
    expect(sent).toEqual([{ sentences: [sentence] }]);

    await user.selectOptions(screen.getByLabelText('On what'), 'letter');
    await user.selectOptions(screen.getByLabelText('First free place on the sheet'), '3');
    await user.type(screen.getByLabelText(/On the scale/u), '2430');
    expect(print).toHaveAttribute(
      'href',
      '/api/staff/orders/2421/labels.pdf?paper=letter&label=cake&copies=1&start=3&weighedG=2430',
    );
  });

  it('keep the card by the time the cake is cut', async () => {
    const { user } = open({ ...stopped, servedAt: 930 });
    const card = await screen.findByRole('link', { name: 'Open the care card to print' });
    expect(card).toHaveAttribute(
      'href',
      '/api/staff/orders/2421/care-card.pdf?paper=half-letter&servedAt=930',
    );
    await user.selectOptions(screen.getByLabelText('Paper'), 'a5');
    expect(card.getAttribute('href')).toContain('paper=a5');
  });
});
