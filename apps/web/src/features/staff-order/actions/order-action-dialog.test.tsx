import { screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it, vi } from 'vitest';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import {
  confirmationFixture,
  eggStop,
  nothingAllowed,
  staffOrderFixture,
} from '#web/testing/staff-order.ts';
import { OrderActionDialog } from './order-action-dialog.tsx';
import type { OrderAct } from './order-act.ts';

const server = startApiServer();
const orders = '*/api/staff/orders/2431';
const mayConfirm = { ...nothingAllowed, confirm: true };

function has(order: StaffOrder) {
  server.use(http.get(orders, () => HttpResponse.json(order)));
}

function looks(look = confirmationFixture()) {
  server.use(http.get(`${orders}/confirmation`, () => HttpResponse.json(look)));
}

/** Answers every such act, and remembers what was sent. */
function takes(act: string, answer: () => Response) {
  const sent: unknown[] = [];
  server.use(
    http.post(`${orders}/${act}`, async ({ request }) => {
      sent.push(await request.json());
      return answer();
    }),
  );
  return sent;
}

function problem(status: number, code: string, title: string) {
  return HttpResponse.json({ type: 'about:blank', title, status, code }, { status });
}

function open(act: OrderAct) {
  const onClose = vi.fn();
  const view = renderAt(
    '/staff/calendar',
    <OrderActionDialog number={2431} act={act} menu={menuFixture} onClose={onClose} />,
  );
  return { ...view, onClose };
}

describe('confirming', () => {
  it('shows the price and the e-mail as it will go, then takes one press', async () => {
    has(staffOrderFixture({ can: mayConfirm }));
    looks();
    const sent = takes('confirm', () =>
      HttpResponse.json(staffOrderFixture({ status: 'confirmed', rowVersion: 4 })),
    );
    const { user, onClose } = open('confirm');
    const press = await screen.findByRole('button', { name: 'Confirm and send it' });
    expect(screen.getByText('They pay')).toBeVisible();
    const frame = screen.getByTitle('The e-mail to rosa@example.com');
    expect(frame).toHaveAttribute('srcdoc', '<p>Your order is confirmed.</p>');
    expect(frame).toHaveAttribute('sandbox', '');
    await user.click(screen.getByRole('radio', { name: 'Plain text' }));
    expect(screen.getByText('Your order is confirmed.')).toBeVisible();
    await user.click(press);
    await waitFor(() => expect(onClose).toHaveBeenCalled());
    expect(sent).toEqual([{ rowVersion: 3 }]);
    expect(
      screen.getByText('No. 2431 is confirmed. The e-mail is on its way to rosa@example.com.'),
    ).toBeVisible();
  });

  it('says what must be settled first and where, and offers no press', async () => {
    has(staffOrderFixture({ can: mayConfirm, blockers: [eggStop] }));
    looks(confirmationFixture({ blockers: [eggStop] }));
    open('confirm');
    const blocked = await screen.findByRole('alert');
    expect(within(blocked).getByText(eggStop.plain)).toBeVisible();
    expect(within(blocked).getByRole('link')).toHaveAttribute('href', '/staff/orders/2431#settle');
    expect(screen.queryByRole('button', { name: 'Confirm and send it' })).toBeNull();
  });

  it('loads the order again when somebody changed it, and keeps what was written', async () => {
    const first = staffOrderFixture({ can: mayConfirm });
    has(first);
    looks();
    let tries = 0;
    const sent = takes('confirm', () => {
      tries += 1;
      if (tries > 1) {
        return HttpResponse.json(staffOrderFixture({ status: 'confirmed', rowVersion: 9 }));
      }
      has({ ...first, rowVersion: 8 });
      looks(confirmationFixture({ rowVersion: 8 }));
      return problem(409, 'changed-meanwhile', 'Somebody changed this meanwhile');
    });
    const { user, onClose } = open('confirm');
    await user.type(
      await screen.findByRole('textbox', { name: /A word of yours/ }),
      'Looking forward!',
    );
    await user.click(screen.getByRole('button', { name: 'Confirm and send it' }));
    expect(await screen.findByText('Somebody changed this meanwhile')).toBeVisible();
    expect(screen.getByText(/loaded again as it is now/)).toBeVisible();
    expect(screen.getByRole('textbox', { name: /A word of yours/ })).toHaveValue(
      'Looking forward!',
    );
    expect(onClose).not.toHaveBeenCalled();
    await waitFor(async () => {
      await user.click(screen.getByRole('button', { name: 'Confirm and send it' }));
      expect(sent.at(-1)).toEqual({ rowVersion: 8, note: 'Looking forward!' });
    });
    await waitFor(() => expect(onClose).toHaveBeenCalled());
  });
});

describe('declining', () => {
  it('wants a reason, offers the nearest open days, and sends both', async () => {
    has(staffOrderFixture({ can: { ...nothingAllowed, decline: true } }));
    server.use(
      http.post('*/api/dates', () =>
        HttpResponse.json({
          likely: false,
          firstOpen: null,
          days: ['2027-06-23', '2027-06-25', '2027-06-26', '2027-06-30'].map((date) => ({
            date,
            answer: date === '2027-06-23' ? 'closed' : 'open',
            reason: null,
            fill: 0,
            windows: [],
          })),
        }),
      ),
    );
    const sent = takes('decline', () =>
      HttpResponse.json(staffOrderFixture({ status: 'declined' })),
    );
    const { user, onClose } = open('decline');
    expect(await screen.findByText('Friday 25 June and Wednesday 30 June.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Decline and tell them' }));
    const why = screen.getByRole('textbox', { name: 'Why' });
    expect(why).toHaveAccessibleDescription(/Tell the customer why\./);
    expect(sent).toEqual([]);
    await user.type(why, 'Our oven is away that week.');
    await user.click(screen.getByRole('button', { name: 'Decline and tell them' }));
    await waitFor(() => expect(onClose).toHaveBeenCalled());
    expect(sent).toEqual([
      { rowVersion: 3, reason: 'Our oven is away that week.', offerDates: true },
    ]);
  });
});

describe('handing over', () => {
  it('knows who was expected and notes who came', async () => {
    const order = staffOrderFixture({
      status: 'ready',
      can: { ...nothingAllowed, collect: true },
    });
    has({
      ...order,
      allergies: [
        {
          id: 'a1',
          allergen: 'sesame',
          species: null,
          text: '',
          severity: 'anaphylaxis',
          guests: 2,
          answer: null,
        },
      ],
      contacts: [
        ...order.contacts,
        { as: 'collects', name: 'Theo Marsh', email: '', phone: '', reachBy: 'phone' },
      ],
    });
    const sent = takes('collected', () =>
      HttpResponse.json(staffOrderFixture({ status: 'collected' })),
    );
    const { user, onClose } = open('collect');
    expect(await screen.findByRole('textbox', { name: 'Who takes it' })).toHaveValue('Theo Marsh');
    // What is said aloud as it changes hands: the guests' allergies, what is in it, what comes out.
    const say = screen.getByRole('region', { name: 'Say this as you hand it over' });
    expect(say).toHaveTextContent('Sesame: allergy, anaphylaxis, 2 guests');
    expect(say).toHaveTextContent(/Contains: .*egg/);
    expect(say).toHaveTextContent(/Hidden inside: .*dowels/);
    await user.type(screen.getByRole('textbox', { name: /How it looked/ }), 'Cold and upright');
    await user.click(screen.getByRole('button', { name: 'It is collected' }));
    await waitFor(() => expect(onClose).toHaveBeenCalled());
    expect(sent).toEqual([
      { rowVersion: 3, collectedBy: 'Theo Marsh', condition: 'Cold and upright', photoId: null },
    ]);
  });

  it('says where the order is instead when it can no longer be done', async () => {
    has(staffOrderFixture({ status: 'collected' }));
    open('collect');
    expect(await screen.findByText('No. 2431 is now: collected.')).toBeVisible();
    expect(screen.queryByRole('textbox')).toBeNull();
  });
});
