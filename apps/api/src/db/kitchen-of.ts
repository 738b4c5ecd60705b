import { kitchenRules, type KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { Studio } from './models/studio.ts';

/** The kitchen's figures: what the studio has set, and the usual for the rest. */
export function kitchenOf({ kitchen }: Studio): KitchenRules {
  return kitchenRules.parse(kitchen);
}
