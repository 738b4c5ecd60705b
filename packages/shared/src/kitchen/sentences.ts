/** "a", "a or b", "a, b or c". */
export function orList(words: readonly string[]): string {
  if (words.length < 2) return words[0] ?? '';
  return `${words.slice(0, -1).join(', ')} or ${words.at(-1) ?? ''}`;
}

const counts = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six'] as const;

/** "Three tiers", "One tier": counts above six stay figures. */
export function countOf(count: number, one: string, many = `${one}s`): string {
  return `${counts[count] ?? String(count)} ${count === 1 ? one : many}`;
}

/** "one cutting cake", "three cutting cakes". */
export function cuttingWords(count: number): string {
  return countOf(count, 'cutting cake').toLowerCase();
}

/** The first letter in upper case, the rest as it is. */
export function capitalise(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** Adds the kind to a name that does not say it already: "Lemon" + "sponge". */
export function named(name: string, kind: string): string {
  return name.toLowerCase().includes(kind) ? name : `${name} ${kind}`;
}
