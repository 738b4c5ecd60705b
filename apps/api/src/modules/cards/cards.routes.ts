import type { Response } from 'express';
import * as z from 'zod/mini';
import {
  cakeCare,
  careCardQuery,
  confirmUnknown as confirmUnknownBody,
  orderLabels,
  printLabelsQuery,
  type CareCardQuery,
  type LabelText,
  type PrintLabelsQuery,
} from '#shared/contracts/cards.ts';
import { netWeightText } from '#shared/kitchen/labels/type-size.ts';
import { limitByAddress } from '#api/http/rate-limit.ts';
import { createRoutes, type FeatureRoutes } from '#api/http/route.ts';
import type { Order } from '#api/db/models/order.ts';
import { authorise, requireStaff, reveal } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { findOrderByCode, findOrderByNumber } from '#api/modules/orders/orders.queries.ts';
import type { Actor } from '#api/platform/actor.ts';
import { AppError, invalidField, notFound } from '#api/platform/app-error.ts';
import { printCareCard } from './care-card.queries.ts';
import { hasCare, mayCard, type CardAction } from './cards.policy.ts';
import { presentCare, presentLabels, resourceOf, stopsOf } from './cards.presenter.ts';
import { findOrderByCareCode } from './care-code.queries.ts';
import { confirmUnknown } from './confirm-unknown.command.ts';
import { loadCardSource, type CardSource } from './label-source.queries.ts';
import { labelsPdf, type LabelJob } from './pdf/label-pdf.ts';

const byNumber = z.object({ number: z.string().check(z.regex(/^\d{1,9}$/)) });
const byCode = z.object({ code: z.string().check(z.maxLength(20)) });

/** Labels and the care card of an order, for staff and for whoever it belongs to. */
export function cardsRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();
  const source = (order: Order, servedAt?: number) =>
    loadCardSource(order, deps.clock.now(), { servedAt });

  routes.add(
    {
      name: 'see-labels',
      method: 'get',
      path: '/api/staff/orders/:number/labels',
      summary: 'What the labels of an order will say, and what keeps them from being printed.',
      params: byNumber,
      response: orderLabels,
      refusals: ['not-found'],
    },
    async ({ actor, params: { number } }) => {
      const order = await findForStaff(actor, 'see-labels', number);
      return presentLabels(await source(order), actor);
    },
  );

  routes.add(
    {
      name: 'print-labels',
      method: 'get',
      path: '/api/staff/orders/:number/labels.pdf',
      summary: 'The labels as a PDF: one of 100 x 62 mm, or a sheet of A4 or US Letter.',
      params: byNumber,
      query: printLabelsQuery,
      produces: 'application/pdf',
      refusals: ['not-found', 'advice-stop'],
    },
    async ({ actor, params: { number }, query, response }) => {
      const order = await findForStaff(actor, 'print-labels', number);
      const card = await source(order);
      const { reasons } = stopsOf(card);
      if (reasons.length > 0) {
        throw new AppError('advice-stop', {
          detail: reasons.map((it) => it.sentence).join(' '),
          facts: { reasons },
        });
      }
      const bytes = await labelsPdf(jobsOf(card, query), {
        paper: query.paper,
        start: query.start ?? 1,
        locale: card.menu.studio.locale,
        title: `Labels No. ${order.number}`,
      });
      sendPdf(response, bytes, `labels-${order.number}.pdf`);
    },
  );

  routes.add(
    {
      name: 'confirm-unknown',
      method: 'post',
      path: '/api/staff/orders/:number/labels/confirm-unknown',
      summary: 'The owner lets what is not known be printed as not known.',
      params: byNumber,
      body: confirmUnknownBody,
      response: orderLabels,
      refusals: ['not-found', 'changed-meanwhile'],
    },
    async ({ actor, params: { number }, body }) => {
      const order = await findForStaff(actor, 'confirm-unknown', number);
      const { reasons } = await source(order);
      await confirmUnknown({ order, actor: requireStaff(actor), reasons, seen: body.sentences });
      return presentLabels(await source(await order.reload()), actor);
    },
  );

  routes.add(
    {
      name: 'print-care-card',
      method: 'get',
      path: '/api/staff/orders/:number/care-card.pdf',
      summary: 'The care card that goes home with the cake, as a PDF.',
      params: byNumber,
      query: careCardQuery,
      produces: 'application/pdf',
      refusals: ['not-found', 'wrong-state'],
    },
    async ({ actor, params: { number }, query, response }) => {
      const order = await findForStaff(actor, 'see-care-card', number);
      if (!hasCare(order.status)) {
        throw new AppError('wrong-state', {
          detail: 'The care card is for a cake that is confirmed.',
        });
      }
      await sendCareCard(response, order, query);
    },
  );

  routes.add(
    {
      name: 'see-care-card',
      method: 'get',
      path: '/api/orders/:code/care-card.pdf',
      summary: 'The care card of a confirmed order, as a PDF, for whoever it belongs to.',
      params: byCode,
      query: careCardQuery,
      produces: 'application/pdf',
      refusals: ['not-found'],
    },
    async ({ actor, params: { code }, query, response }) => {
      const order = await findOrderByCode(code);
      reveal(mayCard(actor, 'see-care-card', resourceOf({ order })) && hasCare(order.status));
      await sendCareCard(response, order, query);
    },
    limitByAddress(deps, 'print-card'),
  );

  async function sendCareCard(response: Response, order: Order, query: CareCardQuery) {
    const bytes = await printCareCard(await source(order, query.servedAt), {
      paper: query.paper,
      publicUrl: deps.env.publicUrl,
    });
    sendPdf(response, bytes, `care-card-${order.number}.pdf`);
  }

  return routes;
}

/** The page about a cake alone: the same for everybody who has its code. */
export function careRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes('anonymous');
  routes.add(
    {
      name: 'see-cake-care',
      method: 'get',
      path: '/api/care/:code',
      summary: 'A cake by the code on its care card: what is in it, how to keep and cut it.',
      params: z.object({ code: z.string().check(z.maxLength(40)) }),
      response: cakeCare,
      refusals: ['not-found'],
    },
    async ({ params: { code }, response }) => {
      response.set('X-Robots-Tag', 'noindex');
      const order = await findOrderByCareCode(code);
      if (order === null || !hasCare(order.status)) throw notFound();
      const source = await loadCardSource(order, deps.clock.now(), { forAnybody: true });
      const care = presentCare(source);
      if (care === null) throw notFound();
      return care;
    },
    limitByAddress(deps, 'see-cake-care'),
  );
  return routes;
}

async function findForStaff(actor: Actor, action: CardAction, number: string): Promise<Order> {
  authorise(actor, actor.kind === 'staff' && mayCard(actor, action, anyOrder));
  return findOrderByNumber(Number(number));
}

/** Staff may or may not by their role, whichever order it is. */
const anyOrder = { id: '', customerId: null, status: 'asked' } as const;

/** Which labels, how often; the grams off the scale go on the one they were weighed for. */
function jobsOf({ labels }: CardSource, query: PrintLabelsQuery): LabelJob[] {
  const chosen = query.label === undefined ? labels : labels.filter((it) => it.id === query.label);
  if (chosen.length === 0) throw invalidField(['label'], 'There is no such label.');
  const { weighedG } = query;
  if (weighedG !== undefined && chosen.length > 1) {
    throw invalidField(['weighedG'], 'Choose the label of the cake that was weighed.');
  }
  return chosen.map((label) => ({
    label: weighedG === undefined ? label : weighed(label, weighedG),
    copies: query.copies ?? label.copies,
  }));
}

function weighed(label: LabelText, grams: number): LabelText {
  return { ...label, net: { grams, text: netWeightText(label.region, grams), weighed: true } };
}

/** Shown by the browser and saved under a name that sorts; nobody's cache keeps it. */
function sendPdf(response: Response, bytes: Buffer, filename: string): void {
  response
    .set({
      'Cache-Control': 'private, no-store',
      'Content-Disposition': `inline; filename="${filename}"`,
    })
    .type('application/pdf')
    .send(bytes);
}
