import type { Design } from '#shared/contracts/design.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { coat, designWith, roundTier } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { atMost, median, type Figure, type Part } from './report.ts';

/*
 * A design worked out whole, as on every keystroke of the wizard: amounts, allergens, advice,
 * price. Each time another head count, so that no proposal is one that was just worked out.
 */

const today = '2027-05-03';
const date = '2027-06-19';

const look = (decorations: number) => ({
  words: [{ tier: 0, text: 'Nell and Tom' }],
  decorations: Array.from({ length: decorations }, (_, at) => ({
    decorationId: menuFixture.decorations[at % menuFixture.decorations.length]?.id ?? '',
    tier: at % 5 === 0 ? null : at % 3,
    quantity: 1 + (at % 4),
    colour: at % 2 === 0 ? '#d9767c' : null,
    source: 'studio' as const,
  })),
});

const threeTiers = designWith({
  cake: {
    tiers: [
      roundTier(10, { fillingId: 'lemon-curd' }),
      roundTier(8, { spongeId: 'chocolate' }),
      roundTier(6),
    ],
    coating: coat({ finish: 'piped' }),
  },
  look: look(4),
  extras: [{ extraId: 'candles', quantity: 2 }],
});

const fiveTiers = designWith({
  guests: {
    allergies: [
      { allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 },
      { allergen: 'tree-nuts', species: 'almond', text: '', severity: 'avoids', guests: 2 },
    ],
    susceptible: true,
  },
  cake: {
    tiers: [14, 12, 10, 8, 6].map((across, at) =>
      roundTier(across, {
        spongeId: at % 2 === 0 ? 'vanilla' : 'chocolate',
        fillingId: at % 2 === 0 ? 'raspberry' : 'lemon-curd',
      }),
    ),
    coating: coat({ style: 'italian', finish: 'textured', colour: '#bcd7ea' }),
  },
  setting: { place: 'shade', warmestC: 27, minutesOut: 150, driveMinutes: 40, servedAt: null },
  look: look(20),
  extras: [{ extraId: 'knife', quantity: 1 }],
});

/** A wedding's worth of head counts, none the same as the one before. */
const otherGuests = (design: Design, at: number): Design => ({
  ...design,
  guests: { ...design.guests, headCount: 20 + (at % 180) },
});

/** Somebody types on the cake. */
const otherWords = (design: Design, at: number): Design =>
  design.look === null
    ? design
    : { ...design, look: { ...design.look, words: [{ tier: 0, text: `Nell and Tom ${at}` }] } };

/** Milliseconds for one, the median of rounds. */
function millisecondsEach(design: Design, change: typeof otherWords): number {
  const rounds = 16;
  const perRound = 250;
  const took = Array.from({ length: rounds }, (_, round) => {
    const before = process.cpuUsage();
    for (let at = 0; at < perRound; at++) {
      const changed = change(design, round * perRound + at);
      evaluateDesign({ design: changed, date }, menuFixture, today);
    }
    // Time on the processor, so that what else runs there is not counted.
    const { user, system } = process.cpuUsage(before);
    return (user + system) / 1000 / perRound;
  });
  // The first half is the compiler's, which learns while it runs.
  return median(took.slice(rounds / 2));
}

export const evaluate: Part = {
  name: 'evaluate',
  about: 'a design worked out whole, three tiers and five with 20 decorations',
  run: (note): Promise<readonly Figure[]> => {
    // Everything once before: the compiler's own work counts too while it learns.
    for (const design of [threeTiers, fiveTiers]) millisecondsEach(design, otherGuests);
    const three = millisecondsEach(threeTiers, otherWords);
    note(`three tiers: ${Math.round(1000 / three)} a second`);
    const five = millisecondsEach(fiveTiers, otherWords);
    note(`five tiers, 20 decorations: ${Math.round(1000 / five)} a second`);
    const guests = millisecondsEach(threeTiers, otherGuests);
    note(`three tiers, other proposals each time: ${Math.round(1000 / guests)} a second`);
    return Promise.resolve([
      atMost('evaluate: three tiers, ms', 0.2, three),
      atMost('evaluate: five tiers and 20 decorations, ms', 1, five),
    ]);
  },
};
