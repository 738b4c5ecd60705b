/** Tried in this order, since several browsers also carry the names of others. */
const browsers: readonly (readonly [mark: RegExp, name: string])[] = [
  [/\bEdgA?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\b(?:Firefox|FxiOS)\//, 'Firefox'],
  [/\b(?:Headless)?(?:Chrome|CriOS|Chromium)\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
];

const systems: readonly (readonly [mark: RegExp, name: string])[] = [
  [/\biPhone\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bMac OS X\b/, 'Mac'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bLinux\b/, 'Linux'],
];

/** A browser's User-Agent as its owner would call it: "Firefox on Windows". */
export function agentWords(agent: string): string {
  const named = (list: typeof browsers) => list.find(([mark]) => mark.test(agent))?.[1];
  const browser = named(browsers) ?? 'A browser';
  const system = named(systems);
  return system === undefined ? browser : `${browser} on ${system}`;
}
