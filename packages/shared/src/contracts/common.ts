import * as z from 'zod/mini';

/** A calendar day in the studio's zone, `YYYY-MM-DD`. Refuses days that do not exist. */
export const localDate = z.iso.date('Choose a day from the calendar.');

/** Minutes since midnight, local time. */
export const minuteOfDay = z.int().check(z.minimum(0), z.maximum(24 * 60));

/** An instant in UTC, ISO 8601 with `Z`. */
export const instant = z.iso.datetime();

/** An amount in minor units of the document's currency; may be negative (a discount). */
export const minor = z.int();

/** An sRGB colour, `#rrggbb`. */
export const colourHex = z
  .string()
  .check(z.regex(/^#[0-9a-f]{6}$/i, 'Write a color as # and six figures.'));

/** No line breaks and no other control characters: what is kept as a line stays one. */
const onOneLine = z.regex(/^\P{Cc}*$/u, 'On one line, please.');

/** Text a person types on one line: trimmed, with an upper limit of characters. */
export const line = (max: number, message = `At most ${max} characters, please.`) =>
  z.string().check(z.trim(), z.maxLength(max, message), onOneLine);

/** One line that must not be empty. */
export const requiredLine = (max: number, missing: string) =>
  z
    .string()
    .check(
      z.trim(),
      z.minLength(1, missing),
      z.maxLength(max, `At most ${max} characters, please.`),
      onOneLine,
    );

/** Longer text, line breaks kept. */
export const prose = (max: number) =>
  z.string().check(z.trim(), z.maxLength(max, `At most ${max} characters, please.`));

/** An e-mail address as people type it; compared in lower case. */
export const emailAddress = z
  .string()
  .check(
    z.trim(),
    z.minLength(1, 'We need an e-mail address.'),
    z.maxLength(254, 'That address is too long.'),
    z.email('Write the address like name@example.com.'),
    z.toLowerCase(),
  );

export const slug = z.string().check(z.minLength(1), z.maxLength(60));
export const id = z.string().check(z.minLength(1), z.maxLength(64));

/** Number of the row as the client last saw it; a mismatch is `changed-meanwhile`. */
export const rowVersion = z.int().check(z.minimum(0));

/** What a command answers when there is nothing to show. */
export const done = z.object({ done: z.literal(true) });
export const itIsDone: z.infer<typeof done> = { done: true };

/** RFC 9457 problem details with every issue's path. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  code: z.string(),
  detail: z.optional(z.string()),
  issues: z.optional(
    z.array(z.object({ path: z.array(z.union([z.string(), z.number()])), message: z.string() })),
  ),
  /** Facts a client may act on, by code: nearest dates, the new estimate, the current row. */
  facts: z.optional(z.record(z.string(), z.unknown())),
});
export type Problem = z.infer<typeof problem>;
