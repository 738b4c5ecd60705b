import type { LabelRegion, Severity } from '#shared/contracts/vocabulary.ts';
import { allergenId } from '#shared/contracts/vocabulary.ts';
import { allergenName, speciesName, spelledFor } from '#shared/kitchen/allergen-names.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';

const severityWords: Readonly<Record<Severity, string>> = {
  avoids: 'avoided',
  intolerance: 'intolerance',
  coeliac: 'coeliac disease',
  allergy: 'allergy',
  anaphylaxis: 'allergy, anaphylaxis',
};

type Declared = {
  readonly allergen: string | null;
  readonly species: string | null;
  readonly text: string;
  readonly severity: string;
  readonly guests: number;
};

/** "Egg: allergy, 1 guest", "Tree nuts (pistachio): allergy, anaphylaxis, 2 guests". */
export function allergyWords(declared: Declared, region: LabelRegion): string {
  const known = allergenId.safeParse(declared.allergen);
  const name = known.success
    ? `${allergenName(known.data, region)}${declared.species === null ? '' : ` (${speciesName(declared.species)})`}`
    : declared.text;
  const how = isSeverity(declared.severity) ? severityWords[declared.severity] : declared.severity;
  const guests = `${declared.guests} ${declared.guests === 1 ? 'guest' : 'guests'}`;
  return `${capitalise(name)}: ${spelledFor(region, how)}, ${guests}`;
}

function isSeverity(word: string): word is Severity {
  return word in severityWords;
}
