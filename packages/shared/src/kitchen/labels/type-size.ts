import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { gPerOunce, mmPerInch } from '../measures.ts';

/** Regulation (EU) 1169/2011 article 13(3): packs whose largest surface is smaller than this. */
const smallPackCm2 = 80;

/**
 * The smallest type a label may be set in, by the height of a small letter, mm. EU and UK: 1.2 mm of
 * x-height, 0.9 mm on a pack whose largest surface is under 80 cm2 (Regulation (EU) 1169/2011,
 * article 13(2) and (3), Annex IV). US: one sixteenth of an inch, measured on the lower case o
 * (21 CFR 101.2(c)).
 */
export function smallestXHeightMm(region: LabelRegion, largestSurfaceCm2: number): number {
  if (region === 'US') return mmPerInch / 16;
  return largestSurfaceCm2 < smallPackCm2 ? 0.9 : 1.2;
}

/**
 * The smallest figures a net weight may be set in, mm. US: by the area of the panel it stands on
 * (21 CFR 101.7(i): 1/16 in up to 5 square inches, 1/8 up to 25, 3/16 up to 100, 1/4 up to 400, 1/2
 * above). EU and UK: by the weight (Directive 76/211/EEC, Annex I 3.1: 2 mm up to 50 g, 3 up to 200,
 * 4 up to 1,000, 6 above).
 */
export function smallestFigureMm(region: LabelRegion, netG: number, panelCm2: number): number {
  if (region !== 'US') return netG <= 50 ? 2 : netG <= 200 ? 3 : netG <= 1000 ? 4 : 6;
  const squareInches = panelCm2 / 2.54 ** 2;
  const inches =
    squareInches <= 5
      ? 1 / 16
      : squareInches <= 25
        ? 1 / 8
        : squareInches <= 100
          ? 3 / 16
          : squareInches <= 400
            ? 1 / 4
            : 1 / 2;
  return inches * mmPerInch;
}

/**
 * A net weight in the words of the region. US: both systems, ounces first and from a pound up to four
 * pounds the pounds beside them (21 CFR 101.7(j)), rounded down so that nobody is promised too much.
 * EU and UK: grams, from a kilogram kilograms.
 */
export function netWeightText(region: LabelRegion, netG: number): string {
  const metric =
    netG < 1000 ? `${Math.floor(netG)} g` : `${(Math.floor(netG / 10) / 100).toFixed(2)} kg`;
  if (region !== 'US') return metric;
  const ounces = Math.floor(netG / gPerOunce + 1e-9);
  if (ounces < 16) return `Net Wt ${ounces} oz (${metric})`;
  const pounds = Math.floor(ounces / 16);
  const rest = ounces % 16;
  const inPounds = rest === 0 ? `${pounds} lb` : `${pounds} lb ${rest} oz`;
  return ounces < 64
    ? `Net Wt ${ounces} oz (${inPounds}) ${metric}`
    : `Net Wt ${inPounds} (${metric})`;
}
