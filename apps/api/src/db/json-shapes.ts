import * as z from 'zod/mini';
import { minor } from '#shared/contracts/common.ts';
import { advice } from '#shared/contracts/estimates.ts';
import { decorationSource } from '#shared/contracts/vocabulary.ts';

/** Shapes of the JSON columns; each is checked on the way in and on the way out. */

export const intList = z.array(z.int());

/** Twelve figures, January first. */
export const monthlyFigures = z.array(z.number()).check(z.length(12));

export const textList = z.array(z.string());

export const adviceList = z.array(advice);

export const sourceList = z.array(decorationSource);

/** Content whose meaning belongs to a feature, which parses it with a schema of its own. */
export const jsonObject = z.record(z.string(), z.json());
export type JsonObject = z.infer<typeof jsonObject>;

/** Facts about an event: ids, codes, counts. Never names, addresses or free text. */
export const idFacts = z.record(
  z.string(),
  z.union([z.string(), z.number(), z.boolean(), z.null()]),
);
export type IdFacts = z.infer<typeof idFacts>;

/** What was agreed about money and handover when the order was sent or last quoted. */
export const orderTerms = z.object({
  depositMinor: minor,
  balanceDueDays: z.int(),
  /** Whether the cake may be handed over with a balance due. */
  handoverWithBalance: z.boolean(),
});
export type OrderTerms = z.infer<typeof orderTerms>;

/** One kept file of a photo. */
export const photoFile = z.object({
  width: z.int(),
  height: z.int(),
  format: z.enum(['avif', 'webp', 'jpeg']),
  bytes: z.int(),
});
export type PhotoFile = z.infer<typeof photoFile>;
export const photoFiles = z.array(photoFile);

/** A file sent with an e-mail, its content in base64. */
export const mailAttachment = z.object({
  filename: z.string(),
  contentType: z.string(),
  base64: z.string(),
});
export type MailAttachment = z.infer<typeof mailAttachment>;
export const mailAttachments = z.array(mailAttachment);
