const formats = new Map<string, Intl.NumberFormat>();

/** A number as the locale writes it; formats are kept, since making one costs more than using it. */
export function figure(
  value: number,
  locale: string,
  most: number,
  signDisplay: 'auto' | 'exceptZero' = 'auto',
): string {
  const key = `${locale} ${most} ${signDisplay}`;
  let format = formats.get(key);
  if (format === undefined) {
    format = new Intl.NumberFormat(locale, { maximumFractionDigits: most, signDisplay });
    formats.set(key, format);
  }
  return format.format(value);
}
