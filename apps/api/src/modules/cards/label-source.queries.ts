import type { LabelText } from '#shared/contracts/cards.ts';
import type { Design } from '#shared/contracts/design.ts';
import type { Estimate } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import type { Pickup } from '#shared/contracts/orders.ts';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import { localAt } from '#shared/dates/local-time.ts';
import type { FormulaNode } from '#shared/kitchen/derive-contents.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import {
  decorationNode,
  keptVersions,
  kitchenBook,
  type KitchenBook,
} from '#shared/kitchen/kitchen-book.ts';
import {
  labelsOf,
  type OrderLabelTexts,
  type PartKeeping,
  type PartRef,
} from '#shared/kitchen/labels/labels-of.ts';
import { partsOf } from '#shared/kitchen/parts.ts';
import { resolveDesign, type ResolvedDesign } from '#shared/kitchen/resolve-design.ts';
import { KitchenAllergen } from '#api/db/models/kitchen-allergen.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { RevisionFormulaVersion } from '#api/db/models/revision-formula-version.ts';
import { menuOver } from '#api/modules/menu/menu-over.queries.ts';
import { designOf, loadRevision } from '#api/modules/orders/order-design.queries.ts';
import { pickupOf } from '#api/modules/orders/pickup.queries.ts';
import { currentPantry, type WholePantry } from '#api/modules/pantry/load-pantry.queries.ts';
import { plannedTasksOf } from '#api/modules/plan/planned-tasks.queries.ts';
import { madeTimesOf } from './made-times.queries.ts';

/** The cake of an order as its cards tell of it: by its own formula versions and today's labels. */
export type CardSource = OrderLabelTexts & {
  readonly order: Order;
  readonly revision: OrderRevision;
  readonly design: Design;
  readonly menu: Menu;
  readonly resolved: ResolvedDesign;
  readonly pickup: Pickup;
  /** By today's labels, for the day it is collected. */
  readonly estimate: Estimate;
  /** The label of the cake on show; null where there is no cake. */
  readonly label: LabelText | null;
};

export type CardAsked = {
  /** When it will be cut, where somebody knows better by now. */
  readonly servedAt?: number;
  /** For readers nobody knows: no word hangs on what guests told. */
  readonly forAnybody?: boolean;
};

/**
 * Everything labels, care card and care page of an order are made from. The revision that was agreed
 * stands until another is.
 */
export async function loadCardSource(
  order: Order,
  now: Date,
  { servedAt, forAnybody = false }: CardAsked = {},
): Promise<CardSource> {
  const revisionId = order.agreedRevisionId ?? order.currentRevisionId;
  if (revisionId === null) throw new Error(`Order ${order.id} has no revision.`);
  const [revision, kept, pantry, over, assessments, madeTimes, tasks] = await Promise.all([
    loadRevision(revisionId),
    RevisionFormulaVersion.findAll({ where: { revisionId } }),
    currentPantry(),
    menuOver(now),
    KitchenAllergen.findAll(),
    madeTimesOf(order.id),
    plannedTasksOf([order.id]),
  ]);
  const book = kitchenBook(pantry);
  const own = keptVersions(
    kept.map((it) => it.formulaVersionId),
    book,
  );
  const versionOf = (formulaId: string) => own.get(formulaId);
  const menu = over(book, versionOf);
  const design = servedThen(designOf(revision), servedAt);
  const resolved = resolveDesign(design, menu);
  const pickup = pickupOf(order, revision);
  const pickupAt = new Date(pickup.startAt);
  const makings = makingsOf({ pantry, book, versionOf, resolved, madeTimes, otherwise: pickupAt });
  // Boxing and handing over make nothing.
  const made = (tasks.get(order.id) ?? []).filter(
    ({ kind }) => kind !== 'handover' && kind !== 'box',
  );
  const ended = made.map((it) => new Date(it.startAt).getTime() + it.minutes * 60_000);
  const texts = labelsOf({
    resolved,
    ...makings,
    assessed: new Set(
      assessments
        .filter((it) => it.assessment !== null && it.assessment.trim() !== '')
        .map((it) => it.allergen),
    ),
    ...(forAnybody ? { heeded: allergenIds } : {}),
    number: order.number,
    occasion: menu.occasions.find((it) => it.id === design.guests.occasionId)?.name ?? 'Cake',
    madeOn: ended.length === 0 ? null : localAt(new Date(Math.max(...ended)), order.zone).date,
    pickupAt,
  });
  return {
    ...texts,
    order,
    revision,
    design,
    menu,
    resolved,
    pickup,
    estimate: evaluateDesign(
      { design, date: pickup.date, collectAt: pickup.start },
      menu,
      localAt(now, order.zone).date,
    ),
    label: texts.labels.find((it) => it.id === 'cake') ?? null,
  };
}

function servedThen(design: Design, servedAt: number | undefined): Design {
  if (servedAt === undefined || design.setting === null) return design;
  return { ...design, setting: { ...design.setting, servedAt } };
}

type Makings = {
  readonly pantry: WholePantry;
  readonly book: KitchenBook;
  readonly versionOf: (formulaId: string) => string | undefined;
  readonly resolved: ResolvedDesign;
  readonly madeTimes: ReadonlyMap<string, Date>;
  /** When a part is taken to be made that no plan has. */
  readonly otherwise: Date;
};

/** How a part is made and kept, asked by kind and id. */
function makingsOf({ pantry, book, versionOf, resolved, madeTimes, otherwise }: Makings) {
  const names = new Map(partsOf(resolved).map((it) => [`${partKinds[it.kind]}:${it.id}`, it.name]));
  const formulaIdOf = ({ part, id }: PartRef): string | null =>
    find(
      {
        sponge: pantry.parts.sponges,
        filling: pantry.parts.fillings,
        style: pantry.parts.styles,
        covering: pantry.parts.coverings,
        decoration: formulasOf(pantry.parts.decorations),
      }[part],
      id,
    );
  const current = (formulaId: string): FormulaVersion | null => {
    const id = versionOf(formulaId) ?? book.currentVersionIds.get(formulaId);
    return (id === undefined ? undefined : book.versions.get(id)) ?? null;
  };
  const formulaOf = (ref: PartRef): FormulaNode | null => {
    const formulaId = formulaIdOf(ref);
    const version = formulaId === null ? null : current(formulaId);
    if (ref.part !== 'decoration') return version === null ? null : book.node(version.id);
    return decorationOf(ref.id, version, { pantry, book, resolved });
  };
  const keepingOf = (ref: PartRef): PartKeeping | null => {
    const formulaId = formulaIdOf(ref);
    const version = formulaId === null ? null : current(formulaId);
    if (formulaId === null || version === null) return null;
    return {
      name: names.get(`${ref.part}:${ref.id}`) ?? ref.id,
      formulaId,
      madeAt: madeTimes.get(formulaId) ?? otherwise,
      keepsChilledHours: version.keepsChilledHours,
      refrigerate: version.refrigerate,
    };
  };
  return { formulaOf, keepingOf };
}

const partKinds = {
  sponge: 'sponge',
  filling: 'filling',
  buttercream: 'style',
  covering: 'covering',
  decoration: 'decoration',
} as const;

function formulasOf(
  decorations: WholePantry['parts']['decorations'],
): Readonly<Record<string, string>> {
  return Object.fromEntries(
    Object.entries(decorations).flatMap(([id, { formulaId }]) =>
      formulaId === null ? [] : [[id, formulaId] as const],
    ),
  );
}

function find(ids: Readonly<Partial<Record<string, string>>>, id: string): string | null {
  return ids[id] ?? null;
}

/** One decoration of an order, by the formula version the order keeps. */
function decorationOf(
  id: string,
  version: FormulaVersion | null,
  { pantry, book, resolved }: Pick<Makings, 'pantry' | 'book' | 'resolved'>,
): FormulaNode {
  const shown = resolved.decorations.find((it) => it.decoration.id === id)?.decoration;
  const bought = (pantry.parts.decorations[id]?.ingredients ?? []).map(
    ({ ingredientId, grams }) => ({ ingredientId, weightMg: Math.round(grams * 1000) }),
  );
  return decorationNode(
    {
      id,
      name: shown?.name ?? id,
      weightMg: (shown?.weightG ?? 0) * 1000,
      bought,
      versionId: version?.id ?? null,
    },
    book,
  );
}
