import type { AllergyAnswer } from '#shared/contracts/menu.ts';
import type { LabelRegion, Severity } from '#shared/contracts/vocabulary.ts';
import { spelledFor } from '#shared/kitchen/allergen-names.ts';

const names: Readonly<Record<Severity, string>> = {
  avoids: 'Avoids it',
  intolerance: 'Intolerance',
  coeliac: 'Coeliac disease',
  allergy: 'Allergy',
  anaphylaxis: 'Anaphylaxis',
};

/** A column of the table, in the region's spelling. */
export function severityName(severity: Severity, region: LabelRegion): string {
  return spelledFor(region, names[severity]);
}

export const answerNames: Readonly<Record<AllergyAnswer, string>> = {
  take: 'Take',
  talk: 'Talk first',
  refuse: 'Refuse',
};
