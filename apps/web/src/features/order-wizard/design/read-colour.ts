/** `#bcd7ea`, `BCD7EA` or the short `#bce`, as `#rrggbb`; null for anything else. */
export function readColour(text: string): string | null {
  const [, figures = ''] = /^\s*#?([0-9a-f]{3}|[0-9a-f]{6})\s*$/i.exec(text) ?? [];
  if (figures === '') return null;
  const long = figures.length === 3 ? [...figures].map((it) => it + it).join('') : figures;
  return `#${long.toLowerCase()}`;
}
