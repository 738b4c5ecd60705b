import * as z from 'zod/mini';
import { runUntilStopped } from '#fakes/harness/run.ts';
import { start } from './start.ts';

const env = z
  .object({
    GOOGLE_FAKE_PORT: z.prefault(z.coerce.number(), '4103'),
    GOOGLE_FAKE_DATA: z.optional(z.string()),
    GOOGLE_CLIENT_ID: z.prefault(z.string(), 'tierwell'),
    GOOGLE_CLIENT_SECRET: z.prefault(z.string(), 'only-for-the-stand-in'),
    GOOGLE_REDIRECT_URIS: z.prefault(z.string(), ''),
  })
  .parse(process.env);

const fake = await start({
  port: env.GOOGLE_FAKE_PORT,
  dataDir: env.GOOGLE_FAKE_DATA,
  clients: [
    {
      id: env.GOOGLE_CLIENT_ID,
      secret: env.GOOGLE_CLIENT_SECRET,
      redirectUris: env.GOOGLE_REDIRECT_URIS.split(' ').filter((uri) => uri !== ''),
    },
  ],
});

runUntilStopped({
  lines: [`Google stand-in: ${fake.url}`],
  stop: () => fake.stop(),
});
