import type { Advice } from '#shared/contracts/estimates.ts';
import { orList } from '#shared/kitchen/sentences.ts';

type Spoken = Pick<Advice, 'level' | 'sentence' | 'plain' | 'instead' | 'ways'>;

/**
 * Advice as whoever bakes reads it: plainly, and with what would do instead; what speaks to the
 * customer stays with the customer.
 */
export function plainly<Told extends Spoken>(advice: Told): Told {
  const { sentence, plain, ways } = advice;
  return {
    ...advice,
    sentence: plain === '' ? sentence : plain,
    instead: ways.length === 0 ? '' : `Would do: ${orList(ways.map((it) => it.label))}.`,
  };
}
