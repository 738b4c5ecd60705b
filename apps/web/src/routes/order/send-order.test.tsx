import { screen, waitFor } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import { type SubmitOrder, submitOrder } from '#shared/contracts/orders.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { answered } from '#web/features/order-wizard/testing/answered.ts';
import { orderBench } from './testing/order-bench.tsx';

const bench = orderBench();

type Sent = { readonly key: string | null; readonly order: SubmitOrder };

const taken = () =>
  HttpResponse.json(
    {
      code: 'K7Q2M9XD',
      number: 2421,
      hold: { expiresAt: '2027-05-03T15:12:00Z', needsLink: true },
      key: 'the-private-key',
    },
    { status: 201 },
  );

function refused(status: number, code: string, more: Record<string, unknown> = {}) {
  return HttpResponse.json(
    { type: 'about:blank', title: `Refused: ${code}`, status, code, ...more },
    { status },
  );
}

/** The API's answers to sending, one for each request; what came is noted. */
function answerWith(...answers: ((sent: Sent) => Response)[]): Sent[] {
  const all: Sent[] = [];
  bench.server.use(
    http.post('*/api/orders', async ({ request }) => {
      const sent = {
        key: request.headers.get('Idempotency-Key'),
        order: submitOrder.parse(await request.json()),
      };
      all.push(sent);
      const answer = answers[all.length - 1] ?? answers.at(-1);
      if (answer === undefined) throw new Error('no answer');
      return answer(sent);
    }),
  );
  return all;
}

async function openCheck() {
  const { user } = bench.open('/order/check');
  await screen.findByRole('heading', { level: 1, name: 'Is all of this right?' });
  await waitFor(() => expect(screen.queryByText(/Asking the studio/)).not.toBeInTheDocument());
  return { user, press: () => user.click(screen.getByRole('button', { name: /^Send / })) };
}

const sentPage = () => screen.findByRole('heading', { name: 'We have your order, No. 2421' });

describe('sending an order', () => {
  it('sends what the page shows, once, and then forgets the draft', async () => {
    const all = answerWith(taken);
    const values = answered();
    values.look.words = [
      { tier: 0, text: 'Jo & Sam' },
      { tier: 1, text: '  ' },
    ];
    bench.keepDraft(values);
    const { user } = await openCheck();
    await user.dblClick(screen.getByRole('button', { name: 'Send my order' }));
    expect(await sentPage()).toBeVisible();
    expect(all).toHaveLength(1);
    expect(all[0]?.order.look.words).toEqual([{ tier: 0, text: 'Jo & Sam' }]);
    expect(all[0]?.order.seenTotalMinor).toBeGreaterThan(0);
    expect(screen.getByRole('link', { name: 'Open your order' })).toHaveAttribute(
      'href',
      '/orders/K7Q2M9XD#key=the-private-key',
    );
    expect(screen.getByText(/mara@example.com/)).toBeVisible();
    await waitFor(() => expect(bench.kept()).toBeNull());
  });

  it('asks for the same order again after a lost answer, even after a reload', async () => {
    const all = answerWith(() => HttpResponse.error(), taken);
    bench.keepDraft(answered());
    const first = bench.open('/order/check');
    await first.user.click(await screen.findByRole('button', { name: 'Send my order' }));
    expect(await screen.findByText('We could not tell whether it arrived')).toBeVisible();
    first.unmount();

    const { press } = await openCheck();
    await press();
    expect(await sentPage()).toBeVisible();
    expect(all[0]?.key).toBeTruthy();
    expect(all[1]?.key).toBe(all[0]?.key);
    expect(all[1]?.order).toEqual(all[0]?.order);
  });

  it('finds the earlier order where the lost try had arrived and answers changed since', async () => {
    const all = answerWith(
      () => HttpResponse.error(),
      () => refused(409, 'key-reused'),
      taken,
    );
    bench.keepDraft(answered());
    const { user, press } = await openCheck();
    await press();
    await screen.findByText('We could not tell whether it arrived');
    await user.click(screen.getByRole('link', { name: 'Change: Name' }));
    await user.type(await screen.findByLabelText('Your name'), ' Jr');
    await user.click(screen.getByRole('button', { name: 'On to the check' }));
    await user.click(await screen.findByRole('button', { name: 'Send my order' }));
    expect(await sentPage()).toBeVisible();
    expect(screen.getByText('Your earlier try had arrived after all')).toBeVisible();
    expect(all.map((it) => it.order.you.name)).toEqual([
      'Mara Quill',
      'Mara Quill Jr',
      'Mara Quill',
    ]);
    expect(new Set(all.map((it) => it.key)).size).toBe(1);
  });

  it('keeps the rest when the day has gone and takes a nearest one in one press', async () => {
    const all = answerWith(
      () =>
        refused(409, 'date-gone', {
          detail: 'The bench is full before then.',
          facts: { nearest: ['2027-06-18', '2027-06-22'], reason: null },
        }),
      taken,
    );
    bench.keepDraft(answered());
    const { user, press } = await openCheck();
    await press();
    expect(await screen.findByText('Saturday 19 June has just gone')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Tuesday 22 June' }));
    expect(await screen.findByText('Tuesday 22 June 2027')).toBeVisible();
    await press();
    expect(await sentPage()).toBeVisible();
    expect(all[1]?.order.day).toMatchObject({ date: '2027-06-22', windowStart: 600 });
    expect(all[1]?.order.you).toEqual(all[0]?.order.you);
    expect(all[1]?.order.cake).toEqual(all[0]?.order.cake);
    expect(all[1]?.key).not.toBe(all[0]?.key);
  });

  it('shows a changed price and sends it only when pressed again', async () => {
    const all = answerWith(({ order }) => {
      const { date, windowStart: _start, ...guests } = order.day;
      const { cake, setting, look, extras } = order;
      const estimate = evaluateDesign(
        { design: { guests, cake, setting, look, extras }, date },
        menuFixture,
        '2027-05-03',
      );
      estimate.price.totalMinor += 1000;
      const { totalMinor } = estimate.price;
      return refused(409, 'price-changed', {
        facts: { estimate, seenTotalMinor: order.seenTotalMinor, totalMinor },
      });
    }, taken);
    bench.keepDraft(answered());
    const { press } = await openCheck();
    await press();
    expect(await screen.findByText('The price has changed meanwhile')).toBeVisible();
    expect(all).toHaveLength(1);
    await press();
    expect(await sentPage()).toBeVisible();
    expect(all[1]?.order.seenTotalMinor).toBe((all[0]?.order.seenTotalMinor ?? 0) + 1000);
  });

  it('leads from each answer the server refuses to its field', async () => {
    answerWith(() =>
      refused(422, 'invalid-input', {
        issues: [{ path: ['you', 'email'], message: 'We cannot write to that address.' }],
      }),
    );
    bench.keepDraft(answered());
    const { user, press } = await openCheck();
    await press();
    await user.click(await screen.findByRole('link', { name: 'We cannot write to that address.' }));
    expect(await screen.findByLabelText('E-mail', { selector: 'input[type=email]' })).toHaveFocus();
  });

  it('says in words what else is in the way, with everything kept', async () => {
    answerWith(() => refused(429, 'too-many-holds', { detail: 'We already keep several days.' }));
    bench.keepDraft(answered());
    const { press } = await openCheck();
    await press();
    expect(await screen.findByText('We already keep several days.')).toBeVisible();
    expect(bench.kept()).toMatchObject({ values: { you: { name: 'Mara Quill' } }, attempt: null });
  });

  it('has nothing to show on the page after sending where nothing was sent', async () => {
    bench.open('/order/sent');
    expect(await screen.findByText('Nothing was sent from this tab lately')).toBeVisible();
  });
});
