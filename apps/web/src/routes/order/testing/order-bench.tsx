import { cleanup, configure } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Suspense } from 'react';
import { Route, Routes } from 'react-router-dom';
import { afterEach, beforeEach, vi } from 'vitest';
import { datesRequest, type DayAnswer } from '#shared/contracts/dates.ts';
import { estimateRequest } from '#shared/contracts/estimates.ts';
import { datesInRange } from '#shared/dates/local-time.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { SiteHeader } from '#web/components/ui/site-header.tsx';
import type { OrderForm } from '#web/features/order-wizard/draft/empty-order.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { OrderRoutes } from '../order-routes.tsx';

/** The day it is in these tests, well before the cake's. */
export const now = new Date('2027-05-03T14:42:00Z');
const today = '2027-05-03';

const draftKey = 'order-draft';

// Whole pages with their lazy parts: a second is little where several tests share the processor.
configure({ asyncUtilTimeout: 10_000 });

/** An open day with two pickup windows. */
export function openDay(date: string): DayAnswer {
  const window = { minutes: 30, answer: 'open' as const };
  return {
    date,
    answer: 'open',
    reason: null,
    fill: 0.4,
    windows: [
      { start: 600, ...window },
      { start: 660, ...window },
    ],
  };
}

/** A day on which the bench has no room left. */
export function fullDay(date: string): DayAnswer {
  const reason = {
    code: 'full' as const,
    sentence: 'The bench has no room for that much work before then.',
    earliest: null,
    resource: 'bench',
    day: date,
  };
  return { date, answer: 'closed', reason, fill: 1, windows: [] };
}

/**
 * The order's pages against an API that has the menu, prices by the shared rules and keeps every
 * day open; a test changes what it is about.
 */
export function orderBench() {
  const server = startApiServer();
  let answerDay: (date: string) => DayAnswer = openDay;

  beforeEach(() => {
    vi.useFakeTimers({ toFake: ['Date'], now });
    answerDay = openDay;
    server.use(
      http.get('*/api/menu', () => HttpResponse.json(menuFixture)),
      http.get('*/api/session', () => HttpResponse.json({ user: null, googleSignIn: false })),
      http.post('*/api/dates', async ({ request }) => {
        const { from, to, design } = datesRequest.parse(await request.json());
        const days = datesInRange(from, to).map(answerDay);
        return HttpResponse.json({ likely: design.cake === null, days, firstOpen: null });
      }),
      http.post('*/api/estimates', async ({ request }) =>
        HttpResponse.json(
          evaluateDesign(estimateRequest.parse(await request.json()), menuFixture, today),
        ),
      ),
    );
  });

  afterEach(() => {
    // A page that goes away keeps its draft: first it goes, then what it kept.
    cleanup();
    localStorage.clear();
    sessionStorage.clear();
    vi.useRealTimers();
  });

  return {
    server,
    /** What the bench says about each day from now on. */
    daysAre: (answer: (date: string) => DayAnswer) => {
      answerDay = answer;
    },
    /** Opens a page of the order. */
    open: (address: string) =>
      renderAt(
        address,
        <Suspense>
          <SiteHeader name={menuFixture.studio.name} homeTo="/" nav={null}>
            <Routes>
              <Route path="/order/*" element={<OrderRoutes />} />
              <Route path="/orders/:code" element={<h1>The order’s own page</h1>} />
            </Routes>
          </SiteHeader>
        </Suspense>,
      ),
    /** Leaves a draft on the device, as an earlier visit would have. */
    keepDraft: (values: OrderForm, savedAt = now.getTime() - 60_000) =>
      localStorage.setItem(
        draftKey,
        JSON.stringify({
          version: 1,
          savedAt,
          writer: 'an earlier page',
          reached: 'check',
          values,
          pictures: {},
          attempt: null,
        }),
      ),
    /** What the device keeps now. */
    kept: (): unknown => JSON.parse(localStorage.getItem(draftKey) ?? 'null'),
    draftKey,
  };
}
