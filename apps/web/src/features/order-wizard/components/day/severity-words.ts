import type { Severity } from '#shared/contracts/vocabulary.ts';

/** How serious it is, in the words of the form. */
export const severityWords: Readonly<Record<Severity, string>> = {
  avoids: 'Would rather not eat it',
  intolerance: 'Intolerance',
  coeliac: 'Coeliac disease',
  allergy: 'Allergy',
  anaphylaxis: 'Severe allergy (anaphylaxis)',
};
