import * as z from 'zod/mini';

const recipient = z.optional(z.string());

/**
 * Ways to fail; with a `recipient` only where that address is among the recipients:
 * - `refuse-connection`: the greeting is `code` and the connection is closed;
 * - `refuse`: RCPT TO is answered with a 5xx, which is final;
 * - `defer`: RCPT TO is answered with a 4xx, so it is worth trying again;
 * - `drop-after-data`: the message is kept, but the connection is cut before the answer;
 * - `slow`: the answer to the message comes after `ms` milliseconds.
 */
export const smtpFailure = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('refuse-connection'),
    code: z.int().check(z.minimum(400), z.maximum(599)),
  }),
  z.object({
    kind: z.literal('refuse'),
    code: z.int().check(z.minimum(500), z.maximum(599)),
    recipient,
  }),
  z.object({
    kind: z.literal('defer'),
    code: z.int().check(z.minimum(400), z.maximum(499)),
    recipient,
  }),
  z.object({ kind: z.literal('drop-after-data'), recipient }),
  z.object({
    kind: z.literal('slow'),
    ms: z.int().check(z.minimum(0), z.maximum(120_000)),
    recipient,
  }),
]);
export type SmtpFailure = z.infer<typeof smtpFailure>;

export const plannedSmtpFailure = z.object({
  failure: smtpFailure,
  times: z.int().check(z.minimum(1)),
});

/** A message as it arrived, taken apart. `to` holds the envelope's recipients. */
export const mailMessage = z.object({
  id: z.string(),
  receivedAt: z.string(),
  sender: z.string(),
  to: z.array(z.string()),
  from: z.string(),
  subject: z.string(),
  messageId: z.string(),
  inReplyTo: z.string(),
  references: z.array(z.string()),
  text: z.string(),
  html: z.nullable(z.string()),
  headers: z.array(z.object({ name: z.string(), value: z.string() })),
  attachments: z.array(
    z.object({
      filename: z.string(),
      contentType: z.string(),
      size: z.int(),
      inline: z.boolean(),
    }),
  ),
});
export type MailMessage = z.infer<typeof mailMessage>;

/** Which messages: to exactly this address, with this in the subject, received from then on. */
export const messageFilter = z.object({
  to: z.optional(z.string()),
  subject: z.optional(z.string()),
  since: z.optional(z.string()),
});
export type MessageFilter = z.infer<typeof messageFilter>;

/** One thing that a client tried and how it was answered; bodies are in the mailbox alone. */
export const smtpCall = z.object({
  n: z.int(),
  at: z.string(),
  step: z.enum(['connect', 'recipient', 'message']),
  outcome: z.enum(['accepted', 'refused', 'deferred', 'dropped']),
  code: z.int(),
  tls: z.boolean(),
  to: z.array(z.string()),
  messageId: z.optional(z.string()),
});
export type SmtpCall = z.infer<typeof smtpCall>;
