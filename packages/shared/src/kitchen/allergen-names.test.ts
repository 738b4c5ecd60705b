import { describe, expect, it } from 'vitest';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import {
  allergenLabel,
  allergenName,
  declarableAllergens,
  declarableSpecies,
  euCereals,
  euTreeNuts,
  isMajorAllergen,
  sameSpecies,
  speciesName,
  usTreeNuts,
} from './allergen-names.ts';
import { entry } from './testing/contents-fixture.ts';

describe('the lists', () => {
  // Regulation (EU) 1169/2011, Annex II, in its order, told in the ids used here.
  it('have the fourteen of Annex II', () => {
    expect([...allergenIds].sort()).toEqual(
      [
        'gluten-cereals',
        'crustaceans',
        'egg',
        'fish',
        'peanut',
        'soy',
        'milk',
        'tree-nuts',
        'celery',
        'mustard',
        'sesame',
        'sulphites',
        'lupin',
        'molluscs',
      ].sort(),
    );
    expect(euTreeNuts).toHaveLength(8);
    expect(euCereals).toEqual(['wheat', 'spelt', 'khorasan', 'rye', 'barley', 'oats']);
  });

  // FALCPA (2004): eight; FASTER Act (2021): sesame.
  it('have the US nine first for a US studio, and let customers declare the rest', () => {
    const declarable = declarableAllergens('US');
    expect(declarable.slice(0, 9)).toEqual([
      'milk',
      'egg',
      'fish',
      'crustaceans',
      'tree-nuts',
      'peanut',
      'gluten-cereals',
      'soy',
      'sesame',
    ]);
    expect([...declarable].sort()).toEqual([...allergenIds].sort());
    expect(declarableAllergens('EU')).toEqual(allergenIds);
  });

  // FDA, guidance on food allergens, edition of January 2025: twelve, coconut no longer.
  it('have FDA’s twelve tree nuts without coconut', () => {
    expect(usTreeNuts).toHaveLength(12);
    expect(declarableSpecies('tree-nuts', 'US')).not.toContain('coconut');
    expect(declarableSpecies('tree-nuts', 'EU')).toEqual(euTreeNuts);
    expect(declarableSpecies('milk', 'EU')).toEqual([]);
  });
});

describe('names', () => {
  it('follow the region', () => {
    expect(allergenLabel(entry('gluten-cereals', ['wheat']), 'US')).toBe('wheat');
    expect(allergenLabel(entry('gluten-cereals', ['wheat']), 'EU')).toBe('gluten cereals (wheat)');
    expect(allergenLabel(entry('tree-nuts', ['brazil-nut']), 'US')).toBe('tree nuts (Brazil nut)');
    expect(allergenLabel(entry('tree-nuts', ['hazelnut']), 'UK')).toBe('nuts (hazelnut)');
    expect(allergenLabel(entry('milk'), 'US')).toBe('milk');
    expect(allergenName('crustaceans', 'US')).toBe('crustacean shellfish');
    expect(speciesName('english-walnut')).toBe('English walnut');
  });

  it('know which are major where', () => {
    expect(isMajorAllergen(entry('gluten-cereals', ['barley']), 'US')).toBe(false);
    expect(isMajorAllergen(entry('gluten-cereals', ['spelt']), 'US')).toBe(true);
    expect(isMajorAllergen(entry('tree-nuts', ['chestnut']), 'US')).toBe(false);
    expect(isMajorAllergen(entry('celery'), 'US')).toBe(false);
    expect(isMajorAllergen(entry('celery'), 'UK')).toBe(true);
  });

  it('take all walnuts, and all wheats, for one', () => {
    expect(sameSpecies('walnut', 'english-walnut')).toBe(true);
    expect(sameSpecies('spelt', 'wheat')).toBe(true);
    expect(sameSpecies('almond', 'hazelnut')).toBe(false);
  });
});
