import type { EggPart, HouseholdMeasure } from '#shared/contracts/pantry.ts';
import type { IngredientFamily } from '#shared/contracts/pantry.ts';
import type { AllergenState } from '#shared/contracts/vocabulary.ts';

export const familyWords: Readonly<Record<IngredientFamily, string>> = {
  flour: 'Flour',
  sugar: 'Sugar',
  butter: 'Butter',
  fat: 'Fat and oil',
  egg: 'Egg',
  dairy: 'Dairy',
  raising: 'Raising agent',
  starch: 'Starch',
  fruit: 'Fruit',
  nut: 'Nuts',
  chocolate: 'Chocolate and cocoa',
  flavour: 'Flavor',
  colour: 'Color',
  gelling: 'Gelling agent',
  salt: 'Salt',
  liquid: 'Liquid',
  other: 'Other',
};

export const eggPartWords: Readonly<Record<EggPart, string>> = {
  whole: 'Whole egg',
  white: 'Egg white',
  yolk: 'Egg yolk',
};

export const measureWords: Readonly<Record<HouseholdMeasure, string>> = {
  cup: 'cup',
  tablespoon: 'tablespoon',
  teaspoon: 'teaspoon',
  stick: 'stick',
  can: 'can',
  piece: 'piece',
  pinch: 'pinch',
};

export const stateWords: Readonly<Record<AllergenState, string>> = {
  contains: 'contains',
  'may-contain': 'may contain',
  'not-declared': 'not declared',
  unknown: 'unknown',
};

export const factNames = ['gelatine', 'alcohol', 'cochineal', 'honey', 'animalOrigin'] as const;

export const factWords: Readonly<Record<(typeof factNames)[number], string>> = {
  gelatine: 'Gelatin',
  alcohol: 'Alcohol',
  cochineal: 'Cochineal (carmine)',
  honey: 'Honey',
  animalOrigin: 'From meat, fish or slaughter',
};
