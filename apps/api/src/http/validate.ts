import * as z from 'zod/mini';
import { humanMessage } from '#shared/contracts/messages.ts';
import { AppError, type Issue } from '#api/platform/app-error.ts';

/**
 * What the schema makes of the input; throws `invalid-input` with every issue's path otherwise.
 */
export function validate<Schema extends z.ZodMiniType>(
  schema: Schema,
  input: unknown,
): z.output<Schema> {
  const result = z.safeParse(schema, input, { error: humanMessage, reportInput: false });
  if (result.success) return result.data;
  throw new AppError('invalid-input', { issues: result.error.issues.map(toIssue) });
}

function toIssue(issue: z.core.$ZodIssue): Issue {
  return {
    path: issue.path.map((step) => (typeof step === 'symbol' ? String(step) : step)),
    message: issue.message,
  };
}
