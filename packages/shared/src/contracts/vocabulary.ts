import * as z from 'zod/mini';

/** The words of the product that are closed lists; one word for one thing everywhere. */

export const roles = ['customer', 'counter', 'baker', 'owner'] as const;
export const role = z.enum(roles);
export type Role = z.infer<typeof role>;

export const staffRoles = ['counter', 'baker', 'owner'] as const;
export const staffRole = z.enum(staffRoles);
export type StaffRole = z.infer<typeof staffRole>;

export const orderStatuses = [
  'asked',
  'quoted',
  'agreed',
  'confirmed',
  'making',
  'ready',
  'collected',
  'declined',
  'withdrawn',
  'lapsed',
  'cancelled',
  'uncollected',
] as const;
export const orderStatus = z.enum(orderStatuses);
export type OrderStatus = z.infer<typeof orderStatus>;

export const shape = z.enum(['round', 'square', 'rectangle']);
export type Shape = z.infer<typeof shape>;

export const coveringIds = ['buttercream', 'fondant', 'ganache', 'semi-naked'] as const;
export const coveringId = z.enum(coveringIds);
export type CoveringId = z.infer<typeof coveringId>;

export const styleIds = ['american', 'swiss', 'italian', 'french', 'german', 'russian'] as const;
export const styleId = z.enum(styleIds);
export type StyleId = z.infer<typeof styleId>;

export const finishIds = ['smooth', 'textured', 'piped'] as const;
export const finishId = z.enum(finishIds);
export type FinishId = z.infer<typeof finishId>;

export const portionSizeId = z.enum(['coffee', 'dessert', 'party']);

export const place = z.enum(['indoors', 'shade', 'sun']);
export type Place = z.infer<typeof place>;

/** How much fine work a frosting can hold, or a decoration asks for. */
export const detail = z.enum(['none', 'soft', 'fine']);
export type Detail = z.infer<typeof detail>;

export const decorationSource = z.enum(['studio', 'customer', 'florist']);
export type DecorationSource = z.infer<typeof decorationSource>;

export const decorationEdge = z.enum(['edible', 'food-contact-only', 'remove-before-eating']);

/**
 * The fourteen of Regulation (EU) 1169/2011 Annex II; the US nine (FALCPA 2004, FASTER Act 2021)
 * are named through them, wheat being a species of gluten cereals.
 */
export const allergenIds = [
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
] as const;
export const allergenId = z.enum(allergenIds);
export type AllergenId = z.infer<typeof allergenId>;

export const allergenState = z.enum(['contains', 'may-contain', 'not-declared', 'unknown']);
export type AllergenState = z.infer<typeof allergenState>;

export const severities = ['avoids', 'intolerance', 'coeliac', 'allergy', 'anaphylaxis'] as const;
export const severity = z.enum(severities);
export type Severity = z.infer<typeof severity>;

export const dietIds = [
  'vegetarian',
  'vegan',
  'halal',
  'kosher',
  'no-alcohol',
  'no-gelatine',
] as const;
export const dietId = z.enum(dietIds);
export type DietId = z.infer<typeof dietId>;

export const adviceLevel = z.enum(['ok', 'care', 'stop']);
export type AdviceLevel = z.infer<typeof adviceLevel>;

export const photoKind = z.enum(['inspiration', 'print', 'finished', 'handover', 'fault']);
export type PhotoKind = z.infer<typeof photoKind>;

export const labelRegion = z.enum(['US', 'EU', 'UK']);
export type LabelRegion = z.infer<typeof labelRegion>;

export const taskKinds = [
  'bake',
  'custard',
  'buttercream',
  'filling',
  'fill-and-crumb-coat',
  'final-coat',
  'cover',
  'decorate',
  'stack',
  'box',
  'handover',
] as const;
export const taskKind = z.enum(taskKinds);
export type TaskKind = z.infer<typeof taskKind>;
