/** Names that keep their capital wherever they stand. */
const proper = /^(?:Swiss|Italian|French|German|Russian|American)\b/u;

/** A part's name in the middle of a sentence: "vanilla sponge", but "Swiss meringue buttercream". */
export function inSentence(name: string): string {
  return proper.test(name) || !/^\p{Lu}\p{Ll}/u.test(name)
    ? name
    : `${name.charAt(0).toLowerCase()}${name.slice(1)}`;
}
