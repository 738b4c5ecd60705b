import type { Request } from 'express';
import * as z from 'zod/mini';

type Kind = 'array' | 'number' | 'boolean' | 'text';

/**
 * The query of an address as its schema wants it: repeated names become lists, figures numbers,
 * `true` and `false` booleans. What does not fit is left as text for the schema to refuse.
 */
export function readQuery(schema: z.ZodMiniObject, request: Request): Record<string, unknown> {
  const given = new URL(request.url, 'http://query.invalid').searchParams;
  const read: Record<string, unknown> = {};
  for (const [name, field] of Object.entries(schema.shape)) {
    const values = given.getAll(name);
    const [first] = values;
    if (first === undefined) continue;
    const kind = kindOf(field);
    read[name] = kind === 'array' ? values : convert(first, kind);
  }
  return read;
}

function convert(value: string, kind: Kind): unknown {
  if (kind === 'number' && /^-?\d+(\.\d+)?$/.test(value)) return Number(value);
  if (kind === 'boolean' && (value === 'true' || value === 'false')) return value === 'true';
  return value;
}

function kindOf(field: z.core.$ZodType): Kind {
  if (field instanceof z.ZodMiniOptional || field instanceof z.ZodMiniNullable) {
    return kindOf(field.def.innerType);
  }
  if (field instanceof z.ZodMiniArray) return 'array';
  if (field instanceof z.ZodMiniNumber) return 'number';
  if (field instanceof z.ZodMiniBoolean) return 'boolean';
  return 'text';
}
