import { screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Route, Routes } from 'react-router-dom';
import { beforeEach, describe, expect, it } from 'vitest';
import { savePrices, type PricesView, type SavePrices } from '#shared/contracts/prices.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { PricesPage } from './prices-page.tsx';

const server = startApiServer();
let saved: SavePrices[] = [];

const { versionId, ...book } = menuFixture.priceBook;
const named = ({ id, name }: { readonly id: string; readonly name: string }) => ({ id, name });

const pricesFixture = (change: Partial<PricesView> = {}): PricesView => ({
  n: 3,
  versionId,
  content: {
    ...book,
    spongeSurcharges: { chocolate: 25 },
    fillingSurcharges: {},
    styleSurcharges: { swiss: 40 },
    coveringSurcharges: {},
    decorationPrices: {},
    decoratingPerHourMinor: 4200,
    materialsMarkupPpm: 0,
    extraPrices: { candles: 450, knife: 600 },
    labourPerHourMinor: 3200,
    overheadPpm: 180_000,
    targetMarginPpm: 250_000,
    packaging: [],
  },
  currencyFixed: true,
  sponges: menuFixture.sponges.map(named),
  fillings: menuFixture.fillings.map(named),
  styles: menuFixture.styles.map(named),
  coverings: menuFixture.coverings.map(named),
  decorations: menuFixture.decorations.map((it) => ({
    ...named(it),
    per: it.per,
    minutes: it.minutes,
    materialsCostMinor: 90,
  })),
  extras: menuFixture.extras.map(named),
  versions: [{ n: 3, since: '2027-05-01T12:00:00.000Z', by: 'Ida Calloway', orders: 2 }],
  ...change,
});

const open = () =>
  renderAt(
    '/staff/studio/prices',
    <Routes>
      <Route path="/staff/studio/prices" element={<PricesPage />} />
    </Routes>,
  );

/** The words about one of the sample cakes. */
const sample = async (name: string) => {
  const item = (await screen.findByText(name)).closest('li');
  if (item === null) throw new Error(`${name} is in no list.`);
  return within(item);
};

beforeEach(() => {
  saved = [];
  window.sessionStorage.clear();
  server.use(
    http.get('*/api/menu', () => HttpResponse.json(menuFixture)),
    http.get('*/api/staff/prices', () => HttpResponse.json(pricesFixture())),
    http.put('*/api/staff/prices', async ({ request }) => {
      const body = savePrices.parse(await request.json());
      saved.push(body);
      return HttpResponse.json(pricesFixture({ n: 4, content: body.content }));
    }),
  );
});

describe('the price book', () => {
  it('shows what a new price does to three cakes, then saves it as the next version', async () => {
    const { user } = open();
    const [, portion] = await screen.findAllByRole('textbox', { name: 'A portion' });
    if (portion === undefined) throw new Error('There is no second band.');
    const words = await sample('One tier with a name on it');
    const before = words.getByText(/^\$/).textContent;
    await user.clear(portion);
    await user.type(portion, '6.00');
    // 8 in is the second band, up to 260 mm: 25 portions at 1.00 more.
    expect(words.getByText(/would be/).parentElement).toHaveTextContent(
      `$${(Number(before.slice(1)) + 25).toFixed(2)}`,
    );
    expect(screen.getByText('One price differs.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Save the prices' }));
    expect(await screen.findByText(/Saved as version 4/)).toBeVisible();
    expect(saved).toHaveLength(1);
    expect(saved[0]).toMatchObject({ madeFrom: 3 });
    expect(saved[0]?.content.tierBands[1]?.perPortionMinor).toBe(600);
  });

  it('says at the field what cannot be, and keeps what was typed', async () => {
    const { user } = open();
    const smallest = await screen.findByRole('textbox', { name: 'No cake is sold for less than' });
    await user.clear(smallest);
    await user.type(smallest, 'a lot');
    await user.click(screen.getByRole('button', { name: 'Save the prices' }));
    expect(smallest).toBeInvalid();
    expect(smallest).toHaveValue('a lot');
    expect(screen.getByRole('link', { name: 'Write an amount.' })).toBeVisible();
    expect(saved).toHaveLength(0);
  });

  it('keeps what was typed when somebody else was faster, and lets the owner decide', async () => {
    const { user } = open();
    const line = await screen.findByRole('textbox', { name: 'Words, each line of them' });
    await user.clear(line);
    await user.type(line, '13.50');
    const theirs = pricesFixture({
      n: 4,
      versions: [{ n: 4, since: '2027-05-02T12:00:00.000Z', by: 'Noor Hadley', orders: 0 }],
    });
    server.use(
      http.put(
        '*/api/staff/prices',
        () =>
          HttpResponse.json(
            {
              type: 'about:blank',
              title: 'Somebody changed this meanwhile',
              status: 409,
              code: 'changed-meanwhile',
            },
            { status: 409 },
          ),
        { once: true },
      ),
      http.get('*/api/staff/prices', () => HttpResponse.json(theirs)),
    );
    await user.click(screen.getByRole('button', { name: 'Save the prices' }));
    expect(await screen.findByText('Noor Hadley saved version 4 meanwhile')).toBeVisible();
    expect(line).toHaveValue('13.50');
    await user.click(screen.getByRole('button', { name: 'Go on with mine' }));
    await user.click(screen.getByRole('button', { name: 'Save the prices' }));
    await waitFor(() => expect(saved).toHaveLength(1));
    expect(saved[0]).toMatchObject({ madeFrom: 4, content: { wordsMinor: 1350 } });
  });

  it('is the owner’s alone', async () => {
    server.use(
      http.get('*/api/staff/prices', () =>
        HttpResponse.json(
          { type: 'about:blank', title: 'No', status: 403, code: 'not-allowed' },
          { status: 403 },
        ),
      ),
    );
    open();
    expect(await screen.findByText('Prices are the owner’s to look after')).toBeVisible();
  });
});
