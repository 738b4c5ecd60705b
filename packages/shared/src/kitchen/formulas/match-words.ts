/** Words of a line or of a name, made comparable: lower case, no accents, singular. */

/** Said of an ingredient without making it another one. */
const incidental = new Set(
  `a an the of and or for with in at to plus about each more some your our from into
  fresh freshly cold warm hot cool chilled frozen thawed soft softened melted room temperature temp
  sifted unsifted packed level heaping chopped diced cubed sliced grated beaten whisked whipped
  lightly finely roughly well very good quality best pure organic large medium small extra jumbo
  divided optional needed taste dusting package packages pkg packet jar carton box bag block
  separated strained drained rinsed peeled cut pieces`
    .split(/\s+/u)
    .filter((it) => it !== ''),
);

/** Names one thing goes by in different kitchens, to the one a shelf is likely to say. */
const sameThing: readonly (readonly [typed: RegExp, shelf: string])[] = [
  [/\b(?:confectioner'?s'?|icing|10x) sugar\b/gu, 'powdered sugar'],
  [/\b(?:white|plain) sugar\b/gu, 'granulated sugar'],
  [/\b(?:heavy )?whipping cream\b|\bdouble cream\b/gu, 'heavy cream'],
  [/\bcorn ?starch\b|\bcornflour\b/gu, 'cornstarch'],
  [/\b(?:cake|pastry) flour\b/gu, 'soft wheat flour'],
  [/\bap flour\b|\bplain flour\b/gu, 'all-purpose flour'],
  [/\bbicarb(?:onate)?(?: of)? soda\b|\bbicarb\b/gu, 'baking soda'],
  [/\bvanilla essence\b/gu, 'vanilla extract'],
  [/\bcondensed milk\b/gu, 'sweetened condensed milk'],
  [/\bsweetened sweetened\b/gu, 'sweetened'],
  [/^(?:egg )?yolks?$/gu, 'egg yolk'],
  [/^(?:egg )?whites?$/gu, 'egg white'],
];

/** `berries` to `berry`, `yolks` to `yolk`; `glass` and `hummus` stay. */
function singular(word: string): string {
  if (word.length > 4 && word.endsWith('ies')) return `${word.slice(0, -3)}y`;
  if (/(?:ches|shes|sses|xes|toes)$/u.test(word)) return word.slice(0, -2);
  return word.length > 3 && /[^su]s$/u.test(word) ? word.slice(0, -1) : word;
}

function plain(text: string): string {
  return text.normalize('NFD').replace(/\p{M}/gu, '').replace(/[’`]/gu, "'").toLowerCase();
}

/** A name as it stands, apart from case, accents and blanks. */
export function sameName(text: string): string {
  return plain(text).replace(/\s+/gu, ' ').trim();
}

/** All words of a name, in any order. */
export function nameWords(text: string): string[] {
  return (
    plain(text)
      .replace(/'s?\b/gu, '')
      .match(/[\p{L}\p{N}]+/gu) ?? []
  ).map(singular);
}

/** The words of a typed ingredient that tell which one it is. */
export function tellingWords(text: string): string[] {
  let typed = sameName(text);
  for (const [words, shelf] of sameThing) typed = typed.replace(words, shelf);
  const all = nameWords(typed);
  const telling = all.filter((it) => !incidental.has(it));
  return telling.length > 0 ? telling : all;
}

/** One letter too many, too few, another, or two swapped; for words of five letters and more. */
export function nearlySame(a: string, b: string): boolean {
  if (a === b) return true;
  if (Math.min(a.length, b.length) < 5 || Math.abs(a.length - b.length) > 1) return false;
  let at = 0;
  while (at < a.length && a[at] === b[at]) at += 1;
  const restA = a.slice(at);
  const restB = b.slice(at);
  return (
    restA.slice(1) === restB ||
    restA === restB.slice(1) ||
    restA.slice(1) === restB.slice(1) ||
    (restA[0] === restB[1] && restA[1] === restB[0] && restA.slice(2) === restB.slice(2))
  );
}
