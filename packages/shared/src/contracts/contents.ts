import * as z from 'zod/mini';
import { id, instant, requiredLine, rowVersion } from './common.ts';
import { containedAllergen } from './estimates.ts';
import { allergenEntry } from './menu.ts';

/** What a whole order contains, and what is handled near it; what is unknown counts as there. */
export const orderContents = z.object({
  allergens: z.array(containedAllergen),
  /** Also handled in the kitchen. */
  handled: z.array(allergenEntry),
  gelatine: z.boolean(),
  alcohol: z.boolean(),
  cochineal: z.boolean(),
  honey: z.boolean(),
  animalOrigin: z.boolean(),
  undercookedEgg: z.boolean(),
});
export type OrderContents = z.infer<typeof orderContents>;

/** One difference in what an order contains: "It contains soy now.", as product facts. */
const differences = z.array(z.string());

/** An order contains something else than its customer was told: as the customer reads it. */
export const contentChangeView = z.object({
  id,
  at: instant,
  /** In sentences, about the cake and never about who eats it. */
  changes: differences,
});
export type ContentChangeView = z.infer<typeof contentChangeView>;

/** The same as staff read it. */
export const staffContentChange = z.object({
  ...contentChangeView.shape,
  /** What it comes from: "Dark chocolate buttons, 58 %", or a formula and its version. */
  cause: z.string(),
  by: z.string(),
  /** What guests declared is against it now: a baker has to write what is done about it. */
  clashes: z.array(z.string()),
  /** When the customer's mail goes out unless the change is put right first; null without address. */
  mailAt: z.nullable(instant),
  /** It was to go out by now and has not arrived: staff tell the customer themselves. */
  mailLate: z._default(z.boolean(), false),
  acknowledged: z.nullable(z.object({ by: z.string(), at: instant, note: z.string() })),
  /** How the customer came to know; null while they do not. */
  told: z.nullable(z.object({ by: z.string(), at: instant, how: z.string() })),
});
export type StaffContentChange = z.infer<typeof staffContentChange>;

/** `POST /api/staff/orders/:number/contents/:id/acknowledge`: a baker has seen it. */
export const acknowledgeContents = z.object({
  rowVersion,
  /** What is done about it; needed where it is against what guests declared. */
  note: z.string().check(z.trim(), z.maxLength(1000, 'At most 1,000 characters, please.')),
});
export type AcknowledgeContents = z.infer<typeof acknowledgeContents>;

/** `POST .../contents/:id/told`: the customer was told otherwise than by e-mail. */
export const tellContents = z.object({
  rowVersion,
  how: requiredLine(500, 'Write how and by whom they were told.'),
});
export type TellContents = z.infer<typeof tellContents>;
