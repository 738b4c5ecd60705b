import { describe, expect, it } from 'vitest';
import { labelsPerSheet, type LabelText } from '#shared/contracts/cards.ts';
import { AppError } from '#api/platform/app-error.ts';
import { readPdf } from '#api/testing/read-pdf.ts';
import { cardFonts, measuresOf, printable } from './fonts.ts';
import { labelSheets, labelsPdf } from './label-pdf.ts';

const label: LabelText = {
  id: 'cake',
  copies: 1,
  region: 'US',
  studio: { name: 'Oxbow Lane Cake Studio', address: '14 Oxbow Lane, Alder Falls, NY 13999' },
  product: 'Cake: vanilla sponge, raspberry jam filling, Swiss meringue buttercream',
  about: 'Wedding, No. 2421',
  ingredients: [{ text: 'Sugar, wheat flour, butter (cream), eggs.', emphasised: false }],
  contains: 'Contains: Milk, Egg, Wheat.',
  signpost: null,
  notKnown: [],
  mayContain: null,
  makersWarn: null,
  kitchen: 'Made in a kitchen that also handles peanut.',
  net: { grams: 7080, text: 'Net Wt 15 lb 9 oz (7.08 kg)', weighed: false },
  madeOn: '2027-06-18',
  useBy: '2027-06-21',
  keep: ['Keep refrigerated, at 41 °F / 5 °C or colder.'],
  remove: ['Hidden inside: 2 boards and 9 dowels.'],
  cautions: [],
  homeKitchen: '',
  smallestXHeightMm: 25.4 / 16,
  smallestFigureMm: 6.35,
};

const long: LabelText = {
  ...label,
  ingredients: [
    {
      text: `${Array.from({ length: 60 }, (_, at) => `ingredient number ${at}`).join(', ')}.`,
      emphasised: false,
    },
  ],
};

const european: LabelText = {
  ...long,
  region: 'EU',
  contains: null,
  smallestXHeightMm: 1.2,
  smallestFigureMm: 6,
  net: { ...label.net, text: '7.08 kg' },
};

const print = { start: 1, locale: 'en-US', title: 'Labels No. 2421' } as const;
const mmPerPt = 25.4 / 72;

describe('a printed label', () => {
  it.each([
    ['single', 100, 62],
    ['a4', 210, 297],
    ['letter', 215.9, 279.4],
  ] as const)('on %s is a page of %d x %d mm', async (paper, width, height) => {
    const [page] = await readPdf(await labelsPdf([{ label, copies: 1 }], { ...print, paper }));
    expect(page?.widthMm).toBeCloseTo(width, 1);
    expect(page?.heightMm).toBeCloseTo(height, 1);
    const sheet = labelSheets[paper];
    expect(sheet.columns * sheet.rows).toBe(labelsPerSheet[paper]);
    // Every place lies on the paper.
    const right =
      sheet.leftMm + sheet.columns * sheet.labelWidthMm + (sheet.columns - 1) * sheet.gapMm;
    expect(right).toBeLessThanOrEqual(width + 0.05);
    expect(sheet.topMm + sheet.rows * sheet.labelHeightMm).toBeLessThanOrEqual(height + 0.05);
  });

  // 21 CFR 101.2(c), 101.7(i); Regulation (EU) 1169/2011 article 13(2); Directive 76/211/EEC.
  it.each([
    ['US', long],
    ['EU', european],
  ] as const)('in the %s is never set smaller than its law has it', async (_region, text) => {
    const pages = await readPdf(
      await labelsPdf([{ label: text, copies: 1 }], { ...print, paper: 'single' }),
    );
    expect(pages.length).toBeGreaterThan(1);
    const { xHeight } = cardFonts().text;
    const sizes = pages.flatMap((page) => page.sizes);
    for (const { pt, text: words } of sizes) {
      expect(pt * xHeight * mmPerPt, words).toBeGreaterThanOrEqual(text.smallestXHeightMm - 0.01);
    }
    const net = sizes.find((it) => it.text.startsWith(text.net.text.slice(0, 6)));
    expect((net?.pt ?? 0) * cardFonts().display.capHeight * mmPerPt).toBeGreaterThanOrEqual(
      text.smallestFigureMm - 0.01,
    );
  });

  it('runs on over further labels and loses no word', async () => {
    const pages = await readPdf(
      await labelsPdf([{ label: long, copies: 1 }], { ...print, paper: 'single' }),
    );
    const whole = pages.map((it) => it.text).join(' ');
    for (let at = 0; at < 60; at += 1) expect(whole).toContain(`number ${at}`);
    expect(whole).toContain('Contains: Milk, Egg, Wheat.');
    expect(pages[1]?.text).toContain(`No. 2421, 2 of ${pages.length}`);
  });

  it('parts neither the list nor what it contains where one label holds both', async () => {
    const list = Array.from({ length: 24 }, (_, at) => `flavor number ${at}`).join(', ');
    const text: LabelText = { ...label, ingredients: [{ text: `${list}.`, emphasised: false }] };
    const pages = await readPdf(
      await labelsPdf([{ label: text, copies: 1 }], { ...print, paper: 'single' }),
    );
    expect(pages[0]?.text).not.toContain('Ingredients:');
    expect(pages[1]?.text).toContain('Ingredients: flavor number 0,');
    expect(pages[1]?.text).toContain('flavor number 23. Contains: Milk, Egg, Wheat.');
  });

  it('refuses plainly what not even several labels hold', async () => {
    const endless: LabelText = {
      ...label,
      ingredients: [{ text: 'sugar and spice, '.repeat(600), emphasised: false }],
    };
    await expect(
      labelsPdf([{ label: endless, copies: 1 }], { ...print, paper: 'single' }),
    ).rejects.toThrow(AppError);
  });

  it('begins where the sheet is free and goes on to the next one', async () => {
    const job = [{ label, copies: 3 }];
    const two = await readPdf(await labelsPdf(job, { ...print, paper: 'letter', start: 5 }));
    expect(two.map((it) => it.text.split('Oxbow Lane Cake Studio, 14').length - 1)).toEqual([2, 1]);
  });

  it('sets a word that is wider than the label over two lines', async () => {
    const word = 'Donaudampfschifffahrtsgesellschaftskapitänsmützenkuchenteigzubereitung';
    const [page] = await readPdf(
      await labelsPdf([{ label: { ...label, product: word }, copies: 1 }], {
        ...print,
        paper: 'letter',
      }),
    );
    expect(page?.text.replace(/ /gu, '')).toContain(word);
  });
});

describe('the fonts', () => {
  it('tell their own measures', () => {
    // Instrument Sans: x 510, capitals 720 of 1,000 units, as its own glyphs are drawn.
    expect(measuresOf(cardFonts().text.bytes)).toEqual({ xHeight: 0.51, capHeight: 0.72 });
  });

  it('set what they have no letter for in letters they have', () => {
    expect(printable('9¾ in, ½ cup')).toBe('9 3/4 in, 1/2 cup');
    expect(printable('Crème brûlée, Łódź, 71 °C')).toBe('Crème brûlée, Łódź, 71 °C');
    expect(printable('Tiếng')).toBe('Tiêng'.normalize('NFKD').replace(/\p{M}/gu, ''));
    expect(printable('蛋糕')).toBe('??');
  });
});
