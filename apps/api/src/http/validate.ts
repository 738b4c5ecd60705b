import * as z from 'zod/mini';
import { humanMessage } from '#shared/contracts/messages.ts';
import { AppError, invalidField, type Issue } from '#api/platform/app-error.ts';

/**
 * What the schema makes of the input; throws `invalid-input` with every issue's path otherwise.
 */
export function validate<Schema extends z.ZodMiniType>(
  schema: Schema,
  input: unknown,
): z.output<Schema> {
  const result = z.safeParse(schema, input, { error: humanMessage, reportInput: false });
  if (result.success) {
    const unkept = nulIn(result.data);
    if (unkept === null) return result.data;
    throw invalidField(unkept, 'That holds a sign we cannot keep.');
  }
  throw new AppError('invalid-input', { issues: result.error.issues.map(toIssue) });
}

/** Where some text holds U+0000, which ends a statement of the database in the middle. */
function nulIn(value: unknown): (string | number)[] | null {
  if (typeof value === 'string') return value.includes('\0') ? [] : null;
  if (typeof value !== 'object' || value === null) return null;
  for (const [step, inner] of Object.entries(value)) {
    const found = nulIn(inner);
    // Only what is found needs its path.
    if (found !== null) return [Array.isArray(value) ? Number(step) : step, ...found];
  }
  return null;
}

function toIssue(issue: z.core.$ZodIssue): Issue {
  return {
    path: issue.path.map((step) => (typeof step === 'symbol' ? String(step) : step)),
    message: issue.message,
  };
}
