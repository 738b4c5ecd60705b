/** Whether two plain values say the same; NaN is NaN, and nothing else. */
export function same(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  const left = Object.entries(a);
  const right = new Map<string, unknown>(Object.entries(b));
  return (
    Array.isArray(a) === Array.isArray(b) &&
    left.length === right.size &&
    left.every(([key, value]) => right.has(key) && same(value, right.get(key)))
  );
}
