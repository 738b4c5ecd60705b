/** A page of ours to go on to, from whatever was asked for; never another site. */
export function safeNext(asked: string): string | null {
  // A browser reads \ as / and ignores control characters, so //elsewhere hides in several ways.
  return /^\/(?![/\\])[^\\\p{Cc}]{0,299}$/u.test(asked) ? asked : null;
}
