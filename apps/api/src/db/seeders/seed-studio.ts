import { AllergyRule } from '#api/db/models/allergy-rule.ts';
import { EmailText } from '#api/db/models/email-text.ts';
import { KitchenAllergen } from '#api/db/models/kitchen-allergen.ts';
import { PlanState } from '#api/db/models/plan-state.ts';
import { PolicyVersion } from '#api/db/models/policy-version.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { Studio } from '#api/db/models/studio.ts';
import { emailTexts } from './catalogue/email-texts.ts';
import { policies } from './catalogue/policies.ts';
import { firstPriceBook } from './catalogue/price-book.ts';
import { allergyRules, kitchenAllergens, studio } from './catalogue/studio.ts';

/**
 * The studio, its rules, prices and texts; portion sizes must be there.
 * @param requireSecondFactor of staff: production starts with it, the demo without
 */
export async function seedStudio(options: {
  readonly now: Date;
  readonly today: string;
  readonly requireSecondFactor: boolean;
}): Promise<void> {
  await Studio.create({
    ...studio,
    monthlyWarmestC: [...studio.monthlyWarmestC],
    requireSecondFactor: options.requireSecondFactor,
  });
  if ((await PlanState.count()) === 0) await PlanState.create({});
  await AllergyRule.bulkCreate(allergyRules.map((rule) => ({ ...rule })));
  await KitchenAllergen.bulkCreate(
    kitchenAllergens.map((it) => ({ ...it, assessedOn: options.today })),
  );
  await PriceBookVersion.create({ n: 1, content: firstPriceBook, validFrom: options.now });
  await PolicyVersion.bulkCreate(
    policies.map((policy) => ({ ...policy, n: 1, validFrom: options.now })),
  );
  await EmailText.bulkCreate(emailTexts.map((it) => ({ ...it, updatedAt: options.now })));
}
