import * as z from 'zod/mini';

/** `GET /api/health`: the process answers. */
export const health = z.object({ alive: z.literal(true) });
export const itIsAlive: z.infer<typeof health> = { alive: true };

/** `GET /api/ready`: everything it needs answers too; else `unavailable` with the same facts. */
export const readiness = z.object({
  database: z.boolean(),
  migrations: z.boolean(),
  worker: z.boolean(),
});
export type Readiness = z.infer<typeof readiness>;
