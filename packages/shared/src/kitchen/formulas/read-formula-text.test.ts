import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bookOf, bought, shelf, version } from '#shared/kitchen/testing/pantry-fixture.ts';
import { indexPantry } from './pantry-index.ts';
import { formatLine, readFormulaLine, readFormulaText } from './read-formula-text.ts';

const index = indexPantry(
  bookOf(
    [...shelf, bought('old', 'Old cocoa', { archivedAt: '2026-01-01T00:00:00Z' })],
    [version('custard', [['milk', 1000]], { densityGPerMl: 1.08 })],
    { custard: 'Custard for German buttercream' },
  ),
);
const read = (text: string) => readFormulaLine(text, index);
const idOf = (text: string) => {
  const part = read(text).match?.part;
  return part?.kind === 'formula' ? `@${part.formulaVersionId}` : part?.ingredientId;
};

describe('a line as bakers type it', () => {
  it.each<[text: string, part: string, grams: number]>([
    ['340 g milk', 'milk', 340],
    ['340g milk', 'milk', 340],
    ['milk, 340 g', 'milk', 340],
    ['Milk: 340 g', 'milk', 340],
    ['- 340 g milk', 'milk', 340],
    ['☐ 340 g milk*', 'milk', 340],
    ['Milk ........ 340 g', 'milk', 340],
    ['1. 340 g milk', 'milk', 340],
    ['1 1/2 cups milk', 'milk', 366],
    ['1-1/2 cups milk', 'milk', 366],
    ['1½ cups milk', 'milk', 366],
    ['1 ½ cups milk', 'milk', 366],
    ['one and a half cups milk', 'milk', 366],
    ['1/2 c. milk', 'milk', 122],
    ['½ cup of milk', 'milk', 122],
    ['half a cup of milk', 'milk', 122],
    ['1 1/2 cups milk, 340 g', 'milk', 340],
    ['1,250 g granulated sugar', 'sugar', 1250],
    ['1 250 g granulated sugar', 'sugar', 1250],
    ['1,25 kg butter', 'butter', 1250],
    ['0,250 kg butter', 'butter', 250],
    ['1.5 kg butter', 'butter', 1500],
    ['2 x 250 g butter', 'butter', 500],
    ['1 lb butter', 'butter', 453.592],
    ['2 # butter', 'butter', 907.185],
    ['1 lb 4 oz butter', 'butter', 566.99],
    ['butter, 1 lb. 4 oz.', 'butter', 566.99],
    ['454g/1lb/4 sticks butter', 'butter', 454],
    ['2 sticks plus 2 tbsp butter', 'butter', 254.4],
    ['5 sticks (2 1/2 cups, 570 g) butter', 'butter', 570],
    ['two sticks unsalted butter, softened', 'butter', 226],
    ['1 14-oz can condensed milk', 'condensed', 396.893],
    ['1 (14-ounce) can sweetened condensed milk', 'condensed', 396.893],
    ['2 14 oz. cans condensed milk', 'condensed', 793.787],
    ['1 400 g can condensed milk', 'condensed', 400],
    ['1 can condensed milk', 'condensed', 397],
    ['1 can (14 oz, 396 g) condensed milk', 'condensed', 396],
    ['12 large egg yolks (200 g)', 'yolks', 200],
    ['12 yolks', 'yolks', 204],
    ['5 egg whites', 'whites', 165],
    ['3 eggs', 'eggs', 150],
    ['a dozen eggs', 'eggs', 600],
    // USDA AMS 56: extra large 27 oz a dozen, large 24: 50 g x 27 / 24.
    ['4 extra large eggs', 'eggs', 225],
    ['1 cup plus 2 tbsp milk', 'milk', 274.5],
    ['1½ tsp vanilla', 'vanilla', 6.3],
    ['1 T vanilla extract', 'vanilla', 13],
    ['1 t vanilla extract', 'vanilla', 4.2],
    ["2 cups confectioners' sugar", 'powdered-sugar', 240],
    ['2 cups sifted powdered sugar', 'powdered-sugar', 200],
    ['2 cups powdered sugar, sifted', 'powdered-sugar', 240],
    ['sugar, powdered, 300 g', 'powdered-sugar', 300],
    ['1 cup packed brown sugar', 'brown-sugar', 220],
    ['a pinch of salt', 'salt', 0.375],
    ['620 g water', 'water', 620],
    ['100 g Henley & Roe pasteurized egg whites', 'carton-whites', 100],
    ['400 g custard for German buttercream', '@custard-1', 400],
    ['400 g custard', '@custard-1', 400],
  ])('%s', (text, part, grams) => {
    expect(idOf(text)).toBe(part);
    expect(read(text).grams).toBeCloseTo(grams, 3);
    expect(read(text)).toMatchObject({ problem: null, asTyped: text, kind: 'line' });
  });

  it.each([
    ['8-10 oz cream cheese', 9 * 28.349523125],
    ['8 – 10 ounces cream cheese', 9 * 28.349523125],
    ['½ to ¾ cup milk', 152.5],
    ['2 or 3 cups milk', 610],
    // 15 to 45 mL of dairy loosen an American buttercream (common practice, no source).
    ['15 to 45 mL heavy cream', (30 / 236.5882365) * 238],
    ['15 mL to 45 mL heavy cream', (30 / 236.5882365) * 238],
  ])('%s takes the middle and says so', (text, grams) => {
    expect(read(text).grams).toBeCloseTo(grams, 2);
    expect(read(text).decided).toContain('the middle');
  });

  it('keeps what is said of the ingredient apart', () => {
    expect(read('250 g unsalted butter, softened and cubed').note).toBe('softened and cubed');
    expect(read('3 Large eggs, the whites, cold')).toMatchObject({ note: 'cold' });
    expect(read('200 g milk (whole)').note).toBe('whole');
  });

  it('says what it reckoned by a density or a cup', () => {
    expect(read('500 ml milk')).toMatchObject({ reckoned: true });
    expect(read('1 cup custard')).toMatchObject({ reckoned: true });
    expect(read('1 heaping cup flour')).toMatchObject({ reckoned: true, grams: 125 });
    expect(read('500 g milk')).toMatchObject({ reckoned: false });
  });

  it('says how it read a point before three figures', () => {
    expect(read('1.250 g granulated sugar')).toMatchObject({ grams: 1.25 });
    expect(read('1.250 g granulated sugar').decided).toContain('not as thousands');
    expect(read('0.250 kg granulated sugar')).toMatchObject({ grams: 250, decided: null });
  });

  it.each([
    ['For the custard:', 'For the custard'],
    ['For the custard', 'For the custard'],
    ['Custard:', 'Custard'],
    ['# Custard', 'Custard'],
    ['**Custard**', 'Custard'],
    ['FILLING', 'FILLING'],
  ])('%s is a heading', (text, words) => {
    expect(read(text)).toMatchObject({ kind: 'heading', words, problem: null });
  });

  it('takes a shelf’s name in capitals for what it is', () => {
    expect(read('SALT')).toMatchObject({ kind: 'line', problem: { code: 'no-amount' } });
  });

  it.each([
    ['salt to taste', 'to-taste'],
    ['milk', 'no-amount'],
    ['0 g salt', 'no-amount'],
    ['-5 g salt', 'no-amount'],
    ['1 tbsp granulated sugar', 'no-weight'],
    ['300 g marzipan', 'unknown-part'],
    ['3 cups', 'unknown-part'],
    ['350 g caster sugar', 'unknown-part'],
    // Two kinds of white are on the shelf, and which is a matter of safety.
    ['100 g egg whites', 'which-part'],
    // Salted is another thing than unsalted.
    ['200 g salted butter', 'unknown-part'],
    ['Whisk until it is done.', 'not-read'],
    ['???', 'not-read'],
    // Two things on a line: neither is dropped for the other.
    ['5 egg whites + pinch of salt', 'two-things'],
    ['200 g butter and 100 g granulated sugar', 'two-things'],
    ['200 g Whole milk plus 5 g Fine salt', 'two-things'],
    [`${'very '.repeat(60)}long`, 'not-read'],
    // A misspelt word may be another word; the likeliest is the first to choose from.
    ['200 g butteer', 'which-part'],
    ['200 g batter', 'which-part'],
    // Archived.
    ['200 g old cocoa', 'unknown-part'],
  ])('%s is kept as typed and marked', (text, code) => {
    expect(read(text)).toMatchObject({ asTyped: text, problem: { code } });
    const { grams, match, problem } = read(text);
    expect(grams === null || match === null || problem?.code === 'two-things').toBe(true);
  });

  it('offers the nearest of the shelf where nothing is quite what was typed', () => {
    const names = read('200 g salted butter').candidates.map((it) => it.name);
    expect(names).toEqual(['Unsalted butter, 82 % fat']);
    expect(read('200 g salted butter').match).toBeNull();
    expect(read('300 g marzipan').candidates).toEqual([]);
  });

  it('offers only what has every word where something has: whites are no yolks', () => {
    const names = read('100 g egg whites').candidates.map((it) => it.name);
    expect(names.length).toBeGreaterThan(1);
    expect(names.filter((it) => !/white/iu.test(it))).toEqual([]);
  });

  it('takes a word for what is bought before what is made of it', () => {
    const made = version('vanilla-cream', [['vanilla', 1]]);
    const pantry = indexPantry(bookOf(shelf, [made], { 'vanilla-cream': 'Vanilla cream' }));
    expect(readFormulaLine('1 tbsp vanilla', pantry).match?.name).toBe('Pure vanilla extract');
    expect(readFormulaLine('50 g vanilla cream', pantry).match?.name).toBe('Vanilla cream');
  });

  it('takes the part that was picked, whatever the words say', () => {
    const part = { kind: 'ingredient', ingredientId: 'carton-whites' } as const;
    expect(readFormulaLine('100 g egg whites', index, { part })).toMatchObject({
      match: { name: 'Pasteurized egg whites' },
      grams: 100,
      problem: null,
    });
    const gone = { kind: 'ingredient', ingredientId: 'gone' } as const;
    expect(readFormulaLine('100 g gone', index, { part: gone }).problem?.code).toBe('unknown-part');
    const archived = { kind: 'ingredient', ingredientId: 'old' } as const;
    expect(readFormulaLine('100 g Old cocoa', index, { part: archived }).match?.name).toBe(
      'Old cocoa',
    );
  });

  it('reads its own lines back to the same part and grams', () => {
    const named = [
      ...shelf.map((it) => ({ id: it.id, name: it.name })),
      { id: '@custard-1', name: 'Custard for German buttercream' },
    ];
    fc.assert(
      fc.property(
        fc.constantFrom(...named),
        fc.integer({ min: 1, max: 1_000_000_000 }),
        ({ id, name }, mg) => {
          const text = formatLine(mg / 1000, name);
          expect(idOf(text)).toBe(id);
          expect(read(text).grams).toBe(mg / 1000);
        },
      ),
    );
  });
});

describe('a formula as bakers type it', () => {
  const text = [
    'For the custard:',
    '1 1/2 cups milk, 340 g',
    '1/3 cup cornstarch (40 g)',
    '',
    '# Buttercream',
    '5 sticks (2 1/2 cups, 570 g) butter',
    'love, a lot',
  ].join('\r\n');

  it('has its headings as stages, and every line of it', () => {
    const { lines, stages } = readFormulaText(text, index);
    expect(stages).toEqual(['For the custard', 'Buttercream']);
    expect(lines.map((it) => it.kind)).toEqual([
      'heading',
      'line',
      'line',
      'blank',
      'heading',
      'line',
      'line',
    ]);
    expect(lines.map((it) => it.stage)).toEqual([0, 1, 1, 1, 1, 2, 2]);
    expect(lines.map((it) => it.asTyped).join('\r\n')).toBe(text);
    expect(lines.at(-1)?.problem?.code).toBe('not-read');
  });

  it('takes a line that is too long for one as it is, and looks no further', () => {
    const words = 'for a '.repeat(40_000);
    const line = readFormulaLine(words, index);
    expect(line).toMatchObject({ asTyped: words, kind: 'line', amounts: [], match: null });
    expect(line.problem?.code).toBe('not-read');
  });

  it('loses nothing, whatever is typed', () => {
    const scraps = fc.constantFrom(
      '1',
      ' ',
      '/',
      '½',
      '-',
      'cup',
      '(',
      ')',
      ',',
      'g',
      'butter',
      ':',
      '#',
      'x',
      '\u0000',
      '\u0001',
      'é',
      '14-oz can',
      'to',
    );
    fc.assert(
      fc.property(
        fc.array(fc.oneof(scraps, fc.string({ maxLength: 4 })), { maxLength: 30 }),
        (parts) => {
          const typed = parts.join('').replaceAll('\r', '');
          const { lines } = readFormulaText(typed, index);
          expect(lines.map((it) => it.asTyped).join('\n')).toBe(typed);
          for (const { grams } of lines) expect(grams === null || grams > 0).toBe(true);
        },
      ),
    );
  });
});
