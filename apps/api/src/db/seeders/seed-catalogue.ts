import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { CoveringFinish } from '#api/db/models/covering-finish.ts';
import { Covering } from '#api/db/models/covering.ts';
import { DecorationIngredient } from '#api/db/models/decoration-ingredient.ts';
import { Decoration } from '#api/db/models/decoration.ts';
import { Extra } from '#api/db/models/extra.ts';
import { Filling } from '#api/db/models/filling.ts';
import { Finish } from '#api/db/models/finish.ts';
import { Occasion } from '#api/db/models/occasion.ts';
import { PortionSize } from '#api/db/models/portion-size.ts';
import { SheetSize } from '#api/db/models/sheet-size.ts';
import { Skill } from '#api/db/models/skill.ts';
import { Sponge } from '#api/db/models/sponge.ts';
import { TierSize } from '#api/db/models/tier-size.ts';
import { coverings, fillings, finishes, sponges, styles } from './catalogue/cakes.ts';
import type { SeedDecoration } from './catalogue/catalogue-types.ts';
import { decorations } from './catalogue/decorations.ts';
import { extras } from './catalogue/extras.ts';
import { buttercreamFormulas } from './catalogue/formulas-buttercream.ts';
import { fillingFormulas } from './catalogue/formulas-filling.ts';
import { spongeFormulas } from './catalogue/formulas-sponge.ts';
import { occasions, portionSizes, sheetSizes, tierSizes } from './catalogue/sizes.ts';

/** Skills some decorations ask for. */
const skills = [
  { id: 'lettering', name: 'Lettering' },
  { id: 'fine-piping', name: 'Fine piping' },
  { id: 'sugar-flowers', name: 'Sugar flowers' },
  { id: 'sculpting', name: 'Sculpting' },
  { id: 'driving', name: 'Driving' },
];

/** Sizes, occasions, cakes, decorations and extras; the pantry must be there. */
export async function seedCatalogue(): Promise<void> {
  await TierSize.bulkCreate(inOrder(tierSizes));
  await SheetSize.bulkCreate(inOrder(sheetSizes));
  await PortionSize.bulkCreate(inOrder(portionSizes));
  await Occasion.bulkCreate(inOrder(occasions));
  await Skill.bulkCreate(skills);
  await seedCakes();
  for (const [position, decoration] of decorations.entries()) {
    await createDecoration(decoration, position);
  }
  await Extra.bulkCreate(inOrder(extras));
}

async function seedCakes(): Promise<void> {
  await Sponge.bulkCreate(
    sponges.map(({ formula, ...sponge }, position) => ({
      ...sponge,
      formulaId: formula,
      colourHex: colourOf(formula),
      position,
    })),
  );
  await Filling.bulkCreate(
    fillings.map(({ formula, thicknessMm, ...filling }, position) => ({
      ...filling,
      formulaId: formula,
      colourHex: colourOf(formula),
      thicknessUm: Math.round(thicknessMm * 1000),
      position,
    })),
  );
  await ButtercreamStyle.bulkCreate(
    styles.map(({ formula, ...style }, position) => ({ ...style, formulaId: formula, position })),
  );
  await Finish.bulkCreate(inOrder(finishes));
  await Covering.bulkCreate(
    coverings.map(
      ({ formula, colour, crumbCoatMm, finalCoatMm, finishes: _, ...it }, position) => ({
        ...it,
        formulaId: formula,
        colourHex: colour,
        crumbCoatUm: crumbCoatMm * 1000,
        finalCoatUm: finalCoatMm * 1000,
        position,
      }),
    ),
  );
  await CoveringFinish.bulkCreate(
    coverings.flatMap((it) => it.finishes.map((finishId) => ({ coveringId: it.id, finishId }))),
  );
}

async function createDecoration(seed: SeedDecoration, position: number): Promise<void> {
  const { lines, weightG, skill, sources, ...fields } = seed;
  const formula = lines.find((line) => 'formula' in line);
  await Decoration.create({
    ...fields,
    sources: [...sources],
    weightMg: weightG * 1000,
    skillId: skill,
    formulaId: formula === undefined ? null : formula.formula,
    position,
  });
  await DecorationIngredient.bulkCreate(
    lines.flatMap((line) =>
      'ingredient' in line
        ? [
            {
              decorationId: seed.id,
              ingredientId: line.ingredient,
              weightMg: Math.round(line.grams * 1000),
            },
          ]
        : [],
    ),
  );
}

const formulaColours = new Map(
  [...spongeFormulas, ...fillingFormulas, ...buttercreamFormulas].map((it) => [it.id, it.colour]),
);

/** A part is drawn in its formula's own colour. */
function colourOf(formulaId: string): string {
  const colour = formulaColours.get(formulaId);
  if (colour === undefined) throw new Error(`No formula is called ${formulaId}.`);
  return colour;
}

function inOrder<T extends object>(rows: readonly T[]): (T & { position: number })[] {
  return rows.map((row, position) => ({ ...row, position }));
}
