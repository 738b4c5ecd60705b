import type { Design } from '#shared/contracts/design.ts';
import type { Estimate } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { SubmitOrder } from '#shared/contracts/orders.ts';
import type { Issue } from '#api/platform/app-error.ts';
import { AppError } from '#api/platform/app-error.ts';

/** The design inside the wizard's one form. */
export function designOfForm(form: SubmitOrder): Design {
  const { day, cake, setting, look, extras } = form;
  return {
    guests: {
      headCount: day.headCount,
      occasionId: day.occasionId,
      otherDesserts: day.otherDesserts,
      portionSizeId: day.portionSizeId,
      allergies: day.allergies,
      diets: day.diets,
      dietNote: day.dietNote,
      infants: day.infants,
      susceptible: day.susceptible,
    },
    cake,
    setting,
    look,
    extras,
  };
}

/** Where a path inside the design lies in the form: the guests are asked for with the day. */
export function fieldOfForm(path: readonly (string | number)[]): (string | number)[] {
  const [first, ...rest] = path;
  return first === 'guests' ? ['day', ...rest] : [...path];
}

/**
 * What the contract alone cannot see: choices the menu does not have together.
 * @throws `invalid-input` with every such field
 */
export function refuseImpossible(form: SubmitOrder, menu: Menu, estimate: Estimate): void {
  const issues: Issue[] = [...coatIssues(form, menu), ...decorationIssues(form, menu)];
  for (const { code, talk, about, sentence } of estimate.advice) {
    if (code === 'too-big' && !talk) issues.push({ path: ['cake'], message: sentence });
    // Nobody at the studio could settle this: only the customer knows how to shorten it.
    if (code === 'words-length') {
      issues.push({ path: ['look', 'words', ...wordsIndexOf(about), 'text'], message: sentence });
    }
  }
  const photoIds = form.photos.map(({ id }) => id);
  if (new Set(photoIds).size < photoIds.length) {
    issues.push({ path: ['photos'], message: 'The same photo is there twice.' });
  }
  if (issues.length > 0) throw new AppError('invalid-input', { issues });
}

/** Which of the words an advice `words:2` is about. */
function wordsIndexOf(about: string): number[] {
  const index = Number(/^words:(\d+)$/.exec(about)?.[1] ?? Number.NaN);
  return Number.isInteger(index) ? [index] : [];
}

function coatIssues({ cake }: SubmitOrder, menu: Menu): Issue[] {
  const coats = [
    { coat: cake.coating, path: ['cake', 'coating', 'finish'] },
    ...cake.tiers.map((tier, index) => ({
      coat: tier.coating,
      path: ['cake', 'tiers', index, 'coating', 'finish'],
    })),
  ];
  return coats.flatMap(({ coat, path }) => {
    if (coat === null) return [];
    const covering = menu.coverings.find(({ id }) => id === coat.covering);
    return covering?.finishes.includes(coat.finish) === false
      ? [{ path, message: `${covering.name} does not come with that finish.` }]
      : [];
  });
}

function decorationIssues({ look }: SubmitOrder, menu: Menu): Issue[] {
  return look.decorations.flatMap(({ decorationId, source }, index) => {
    const decoration = menu.decorations.find(({ id }) => id === decorationId);
    return decoration?.sources.includes(source) === false
      ? [
          {
            path: ['look', 'decorations', index, 'source'],
            message: `${decoration.name} cannot come from there.`,
          },
        ]
      : [];
  });
}
