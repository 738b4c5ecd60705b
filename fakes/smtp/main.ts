import * as z from 'zod/mini';
import { runUntilStopped } from '#fakes/harness/run.ts';
import { start } from './start.ts';

const env = z
  .object({
    MAILBOX_PORT: z.prefault(z.coerce.number(), '4101'),
    SMTP_PORT: z.prefault(z.coerce.number(), '4102'),
    MAILBOX_DATA: z.optional(z.string()),
  })
  .parse(process.env);

const fake = await start({
  port: env.MAILBOX_PORT,
  smtpPort: env.SMTP_PORT,
  dataDir: env.MAILBOX_DATA,
});

runUntilStopped({
  lines: [`Mailbox: ${fake.url}`, `Mail server: ${fake.smtpUrl}`],
  stop: () => fake.stop(),
});
