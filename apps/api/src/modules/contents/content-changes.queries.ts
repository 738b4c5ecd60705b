import { Op } from 'sequelize';
import type {
  ContentChangeView,
  OrderContents,
  StaffContentChange,
} from '#shared/contracts/contents.ts';
import type { Advice, Estimate } from '#shared/contracts/estimates.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { contentDifferences } from '#shared/kitchen/content-differences.ts';
import { isAboutContents, newAdvice, withContents } from '#shared/kitchen/order-contents.ts';
import { currentClock } from '#api/db/current-database.ts';
import { ContentChange } from '#api/db/models/content-change.ts';
import { FormulaVersion } from '#api/db/models/formula-version.ts';
import { Formula } from '#api/db/models/formula.ts';
import { Ingredient } from '#api/db/models/ingredient.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Studio } from '#api/db/models/studio.ts';
import { User } from '#api/db/models/user.ts';

/** Names the mail that tells a customer of a change, so that it is known whether it went out. */
export const tellingKey = (changeId: string): string => `contents-to-tell:${changeId}`;
const mailKey = (changeId: string): string => `${tellingKey(changeId)}:ingredient-changed`;

/** The changes of what a revision contains that hold, oldest first. */
export function changesOf(revisionIds: readonly string[]): Promise<ContentChange[]> {
  return ContentChange.findAll({
    where: { revisionId: [...revisionIds], endedAt: null },
    order: [['n', 'ASC']],
  });
}

/** What a revision's customer was offered, with what the order contains by now. */
export async function estimateNow(revision: OrderRevision): Promise<Estimate> {
  const [estimate = revision.estimate] = await estimatesNow([revision]);
  return estimate;
}

/** The same for many revisions, in their order. */
export async function estimatesNow(revisions: readonly OrderRevision[]): Promise<Estimate[]> {
  const changes = await changesOf(revisions.map(({ id }) => id));
  const newest = new Map(changes.map((change) => [change.revisionId, change]));
  return revisions.map(({ id, estimate }) => {
    const change = newest.get(id);
    return change === undefined ? estimate : withContents(estimate, change.holds, change.advice);
  });
}

/** When the mail about each change went out, by change. One under way may have arrived already. */
export async function mailedAt(changes: readonly ContentChange[]): Promise<Map<string, Date>> {
  const mails = await SentMail.findAll({
    where: {
      uniqueKey: changes.map(({ id }) => mailKey(id)),
      state: { [Op.in]: ['sent', 'leased'] },
    },
  });
  const byKey = new Map(mails.map((mail) => [mail.uniqueKey, mail.sentAt ?? mail.createdAt]));
  return new Map(
    changes.flatMap(({ id }) => {
      const at = byKey.get(mailKey(id));
      return at === undefined ? [] : [[id, at] as const];
    }),
  );
}

/** What has to happen before a cake whose contents changed is marked ready or handed over. */
export type OpenContents = 'customer-untold' | 'unacknowledged' | null;

export async function openContentsOf(revisionId: string | null): Promise<OpenContents> {
  if (revisionId === null) return null;
  const changes = await changesOf([revisionId]);
  const newest = changes.at(-1);
  if (newest === undefined) return null;
  const isTold = newest.toldAt !== null || (await mailedAt([newest])).size > 0;
  if (!isTold) return 'customer-untold';
  return changes.some((it) => it.clashes && it.acknowledgedAt === null) ? 'unacknowledged' : null;
}

/** The changes as the customer reads them. */
export async function contentChangeViews(revision: OrderRevision): Promise<ContentChangeView[]> {
  const [changes, region] = await Promise.all([changesOf([revision.id]), labelRegion()]);
  return changes.map((change) => ({
    id: change.id,
    at: change.at.toISOString(),
    changes: contentDifferences(change.told, change.holds, region),
  }));
}

/** How long a mail that is due may take before staff are asked to tell the customer themselves. */
const patienceMs = 15 * 60_000;

/** The changes as staff read them, with who did and knows what. */
export async function staffContentChanges(revision: OrderRevision): Promise<StaffContentChange[]> {
  const changes = await changesOf([revision.id]);
  if (changes.length === 0) return [];
  const [region, mailed, causes, names, ordered] = await Promise.all([
    labelRegion(),
    mailedAt(changes),
    causesOf(changes),
    namesOf(changes),
    OrderContact.findOne({ where: { orderId: revision.orderId, role: 'ordered' } }),
  ]);
  const name = (id: string | null) => names.get(id ?? '') ?? '';
  const hasAddress = ordered !== null && ordered.email !== null;
  return changes.map((change, index) => {
    const { acknowledgedAt, toldAt } = change;
    const mail = mailed.get(change.id);
    const knownAdvice = adviceBefore(revision, changes.slice(0, index));
    return {
      id: change.id,
      at: change.at.toISOString(),
      changes: contentDifferences(change.told, change.holds, region),
      cause: causes.get(change.id) ?? '',
      by: name(change.byUserId),
      clashes: change.clashes
        ? newAdvice(knownAdvice, change.advice).map(({ plain, sentence }) =>
            plain === '' ? sentence : plain,
          )
        : [],
      mailAt: hasAddress ? change.mailAt.toISOString() : null,
      mailLate: change.mailAt.getTime() + patienceMs < currentClock().now().getTime(),
      acknowledged:
        acknowledgedAt === null
          ? null
          : {
              by: name(change.acknowledgedByUserId),
              at: acknowledgedAt.toISOString(),
              note: change.acknowledgedNote,
            },
      told:
        toldAt !== null
          ? { by: name(change.toldByUserId), at: toldAt.toISOString(), how: change.toldHow }
          : mail === undefined
            ? null
            : { by: '', at: mail.toISOString(), how: 'By e-mail' },
    };
  });
}

/** What was advised about what is in an order before some changes, or after them. */
export function adviceBefore(
  { estimate }: OrderRevision,
  earlier: readonly ContentChange[],
): readonly Advice[] {
  return earlier.at(-1)?.advice ?? estimate.advice.filter(isAboutContents);
}

/** What an order contained for its customer before some changes: as offered, or as last told. */
export function contentsBefore(
  { estimate }: OrderRevision,
  earlier: readonly ContentChange[],
  derived: OrderContents,
): OrderContents {
  const last = earlier.at(-1);
  return last === undefined
    ? { ...derived, allergens: estimate.allergens, handled: estimate.handled }
    : last.holds;
}

/** What each change comes from, in the words of the shelf. */
export async function causesOf(changes: readonly ContentChange[]): Promise<Map<string, string>> {
  const [ingredients, versions] = await Promise.all([
    Ingredient.findAll({
      where: { id: changes.flatMap(({ ingredientId }) => ingredientId ?? []) },
    }),
    FormulaVersion.findAll({
      where: { id: changes.flatMap(({ formulaVersionId }) => formulaVersionId ?? []) },
      include: [{ model: Formula, as: 'formula' }],
    }),
  ]);
  const bought = new Map(ingredients.map((it) => [it.id, `The label of ${it.name}`]));
  const made = new Map(
    versions.map((it) => [it.id, `${it.formula?.name ?? ''}, version ${String(it.n)}`]),
  );
  return new Map(
    changes.map(({ id, ingredientId, formulaVersionId }) => [
      id,
      bought.get(ingredientId ?? '') ?? made.get(formulaVersionId ?? '') ?? '',
    ]),
  );
}

async function namesOf(changes: readonly ContentChange[]): Promise<Map<string, string>> {
  const ids = changes.flatMap((it) => [
    it.byUserId,
    it.acknowledgedByUserId ?? [],
    it.toldByUserId ?? [],
  ]);
  const users = await User.findAll({ where: { id: [...new Set(ids.flat())] } });
  return new Map(users.map(({ id, name }) => [id, name]));
}

export async function labelRegion(): Promise<LabelRegion> {
  return (await Studio.findByPk(1, { rejectOnEmpty: true })).labelRegion;
}
