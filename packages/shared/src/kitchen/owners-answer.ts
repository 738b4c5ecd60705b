import type { Declaration } from '#shared/contracts/design.ts';
import type { AllergyAnswer, AllergyRule } from '#shared/contracts/menu.ts';

/**
 * The owner's word on a cake that contains what was declared: the allergen's own rule for that
 * severity, else the one for all allergens, else a talk first.
 */
export function ownersAnswer(
  { allergen, severity }: Pick<Declaration, 'allergen' | 'severity'>,
  rules: readonly AllergyRule[],
): AllergyAnswer {
  const ofSeverity = rules.filter((it) => it.severity === severity);
  const rule =
    ofSeverity.find((it) => it.allergen === allergen) ??
    ofSeverity.find((it) => it.allergen === null);
  return rule?.answer ?? 'talk';
}

const strictestFirst: readonly AllergyAnswer[] = ['refuse', 'talk', 'take'];

/** The owner's strictest word on several declarations of one thing; a talk where there are none. */
export function strictestAnswer(
  declared: readonly Pick<Declaration, 'allergen' | 'severity'>[],
  rules: readonly AllergyRule[],
): AllergyAnswer {
  const answers = declared.map((it) => ownersAnswer(it, rules));
  return strictestFirst.find((it) => answers.includes(it)) ?? 'talk';
}
