import { figure } from './figure.ts';

/** Grams as a scale shows them: tenths under 10 g, whole above, thousands parted. */
export function gramsText(grams: number, locale: string): string {
  const digits = grams < 1 ? 2 : grams < 10 ? 1 : 0;
  return `${figure(grams, locale, digits)} g`;
}
