import { Assignment } from './assignment.ts';
import { Authenticator } from './authenticator.ts';
import { Batch } from './batch.ts';
import { BatchShare } from './batch-share.ts';
import { ButtercreamStyle } from './buttercream-style.ts';
import { Consent } from './consent.ts';
import { Covering } from './covering.ts';
import { CoveringFinish } from './covering-finish.ts';
import { DeclaredAllergy } from './declared-allergy.ts';
import { DeclaredDiet } from './declared-diet.ts';
import { Decoration } from './decoration.ts';
import { DecorationIngredient } from './decoration-ingredient.ts';
import { Extra } from './extra.ts';
import { Filling } from './filling.ts';
import { Formula } from './formula.ts';
import { FormulaLine } from './formula-line.ts';
import { FormulaStep } from './formula-step.ts';
import { FormulaVersion } from './formula-version.ts';
import { Handover } from './handover.ts';
import { Hold } from './hold.ts';
import { Identity } from './identity.ts';
import { Ingredient } from './ingredient.ts';
import { IngredientAllergen } from './ingredient-allergen.ts';
import { IngredientMeasure } from './ingredient-measure.ts';
import { ItemColour } from './item-colour.ts';
import { ItemDecoration } from './item-decoration.ts';
import { ItemTier } from './item-tier.ts';
import { LedgerEntry } from './ledger-entry.ts';
import { LiftedStop } from './lifted-stop.ts';
import { MailAttempt } from './mail-attempt.ts';
import { Message } from './message.ts';
import { Occasion } from './occasion.ts';
import { Order } from './order.ts';
import { OrderContact } from './order-contact.ts';
import { OrderEvent } from './order-event.ts';
import { OrderItem } from './order-item.ts';
import { OrderRevision } from './order-revision.ts';
import { Person } from './person.ts';
import { PersonSkill } from './person-skill.ts';
import { Photo } from './photo.ts';
import { Quote } from './quote.ts';
import { QuoteLine } from './quote-line.ts';
import { RecoveryCode } from './recovery-code.ts';
import { RevisionFormulaVersion } from './revision-formula-version.ts';
import { RevisionPolicyVersion } from './revision-policy-version.ts';
import { SentMail } from './sent-mail.ts';
import { Session } from './session.ts';
import { SheetSize } from './sheet-size.ts';
import { Shift } from './shift.ts';
import { ShiftPerson } from './shift-person.ts';
import { Skill } from './skill.ts';
import { Sponge } from './sponge.ts';
import { Task } from './task.ts';
import { Token } from './token.ts';
import { User } from './user.ts';
import { WeeklyShift } from './weekly-shift.ts';
import { WeeklyShiftPerson } from './weekly-shift-person.ts';

/** Foreign keys are the migrations' business. */
const bare = { constraints: false } as const;

/** Every way from one row to another that queries include, in one place. Call once per database. */
export function associateModels(): void {
  Sponge.belongsTo(Formula, { as: 'formula', foreignKey: 'formulaId', ...bare });
  Filling.belongsTo(Formula, { as: 'formula', foreignKey: 'formulaId', ...bare });
  ButtercreamStyle.belongsTo(Formula, { as: 'formula', foreignKey: 'formulaId', ...bare });
  Covering.belongsTo(Formula, { as: 'formula', foreignKey: 'formulaId', ...bare });
  Formula.belongsTo(FormulaVersion, {
    as: 'currentVersion',
    foreignKey: 'currentVersionId',
    ...bare,
  });
  FormulaVersion.belongsTo(Formula, { as: 'formula', foreignKey: 'formulaId', ...bare });
  FormulaLine.belongsTo(Ingredient, { as: 'ingredient', foreignKey: 'ingredientId', ...bare });
  FormulaLine.belongsTo(FormulaVersion, {
    as: 'formulaVersion',
    foreignKey: 'formulaVersionId',
    ...bare,
  });
  Order.belongsTo(OrderRevision, {
    as: 'currentRevision',
    foreignKey: 'currentRevisionId',
    ...bare,
  });
  Order.belongsTo(OrderRevision, { as: 'agreedRevision', foreignKey: 'agreedRevisionId', ...bare });
  Order.belongsTo(User, { as: 'customer', foreignKey: 'customerUserId', ...bare });
  Order.belongsTo(Occasion, { as: 'occasion', foreignKey: 'occasionId', ...bare });
  OrderRevision.belongsTo(Order, { as: 'order', foreignKey: 'orderId', ...bare });
  OrderItem.belongsTo(SheetSize, { as: 'sheetSize', foreignKey: 'sheetSizeId', ...bare });
  OrderItem.belongsTo(Extra, { as: 'extra', foreignKey: 'extraId', ...bare });
  ItemDecoration.belongsTo(Decoration, { as: 'decoration', foreignKey: 'decorationId', ...bare });
  Quote.belongsTo(OrderRevision, { as: 'revision', foreignKey: 'revisionId', ...bare });
  Message.belongsTo(User, { as: 'author', foreignKey: 'authorUserId', ...bare });
  OrderEvent.belongsTo(User, { as: 'actor', foreignKey: 'actorUserId', ...bare });
  Handover.belongsTo(Photo, { as: 'photo', foreignKey: 'photoId', ...bare });
  Handover.belongsTo(User, { as: 'byUser', foreignKey: 'byUserId', ...bare });
  DeclaredAllergy.belongsTo(User, { as: 'answeredBy', foreignKey: 'answeredByUserId', ...bare });
  Person.belongsTo(User, { as: 'user', foreignKey: 'userId', ...bare });
  Task.belongsTo(Order, { as: 'order', foreignKey: 'orderId', ...bare });
  Batch.belongsTo(FormulaVersion, {
    as: 'formulaVersion',
    foreignKey: 'formulaVersionId',
    ...bare,
  });
  BatchShare.belongsTo(Batch, { as: 'batch', foreignKey: 'batchId', ...bare });
  BatchShare.belongsTo(Order, { as: 'order', foreignKey: 'orderId', ...bare });
  Assignment.belongsTo(Task, { as: 'task', foreignKey: 'taskId', ...bare });
  Assignment.belongsTo(Batch, { as: 'batch', foreignKey: 'batchId', ...bare });
  Assignment.belongsTo(Shift, { as: 'shift', foreignKey: 'shiftId', ...bare });
  Hold.belongsTo(Order, { as: 'order', foreignKey: 'orderId', ...bare });
  ShiftPerson.belongsTo(Person, { as: 'person', foreignKey: 'personId', ...bare });
  WeeklyShiftPerson.belongsTo(Person, { as: 'person', foreignKey: 'personId', ...bare });
  PersonSkill.belongsTo(Skill, { as: 'skill', foreignKey: 'skillId', ...bare });
  Identity.belongsTo(User, { as: 'user', foreignKey: 'userId', ...bare });
  Token.belongsTo(User, { as: 'user', foreignKey: 'userId', ...bare });
  Session.belongsTo(User, { as: 'user', foreignKey: 'userId', ...bare });
  DecorationIngredient.belongsTo(Ingredient, {
    as: 'ingredient',
    foreignKey: 'ingredientId',
    ...bare,
  });
  SentMail.belongsTo(Order, { as: 'order', foreignKey: 'orderId', ...bare });

  Covering.hasMany(CoveringFinish, { as: 'coveringFinishes', foreignKey: 'coveringId', ...bare });
  Decoration.hasMany(DecorationIngredient, {
    as: 'ingredients',
    foreignKey: 'decorationId',
    ...bare,
  });
  Ingredient.hasMany(IngredientAllergen, { as: 'allergens', foreignKey: 'ingredientId', ...bare });
  Ingredient.hasMany(IngredientMeasure, { as: 'measures', foreignKey: 'ingredientId', ...bare });
  Formula.hasMany(FormulaVersion, { as: 'versions', foreignKey: 'formulaId', ...bare });
  FormulaVersion.hasMany(FormulaLine, { as: 'lines', foreignKey: 'versionId', ...bare });
  FormulaVersion.hasMany(FormulaStep, { as: 'steps', foreignKey: 'versionId', ...bare });
  Order.hasMany(OrderRevision, { as: 'revisions', foreignKey: 'orderId', ...bare });
  Order.hasMany(OrderContact, { as: 'contacts', foreignKey: 'orderId', ...bare });
  Order.hasMany(Message, { as: 'messages', foreignKey: 'orderId', ...bare });
  Order.hasMany(Photo, { as: 'photos', foreignKey: 'orderId', ...bare });
  Order.hasMany(OrderEvent, { as: 'events', foreignKey: 'orderId', ...bare });
  Order.hasMany(Quote, { as: 'quotes', foreignKey: 'orderId', ...bare });
  Order.hasMany(Hold, { as: 'holds', foreignKey: 'orderId', ...bare });
  Order.hasMany(Task, { as: 'tasks', foreignKey: 'orderId', ...bare });
  Order.hasMany(Handover, { as: 'handovers', foreignKey: 'orderId', ...bare });
  Order.hasMany(SentMail, { as: 'mails', foreignKey: 'orderId', ...bare });
  Order.hasMany(Consent, { as: 'consents', foreignKey: 'orderId', ...bare });
  Order.hasMany(LiftedStop, { as: 'liftedStops', foreignKey: 'orderId', ...bare });
  Order.hasMany(LedgerEntry, { as: 'ledgerEntries', foreignKey: 'orderId', ...bare });
  OrderRevision.hasMany(OrderItem, { as: 'items', foreignKey: 'revisionId', ...bare });
  OrderRevision.hasMany(DeclaredAllergy, { as: 'allergies', foreignKey: 'revisionId', ...bare });
  OrderRevision.hasMany(DeclaredDiet, { as: 'diets', foreignKey: 'revisionId', ...bare });
  OrderRevision.hasMany(RevisionFormulaVersion, {
    as: 'formulaVersions',
    foreignKey: 'revisionId',
    ...bare,
  });
  OrderRevision.hasMany(RevisionPolicyVersion, {
    as: 'policyVersions',
    foreignKey: 'revisionId',
    ...bare,
  });
  OrderItem.hasMany(ItemTier, { as: 'tiers', foreignKey: 'itemId', ...bare });
  OrderItem.hasMany(ItemDecoration, { as: 'decorations', foreignKey: 'itemId', ...bare });
  OrderItem.hasMany(ItemColour, { as: 'colours', foreignKey: 'itemId', ...bare });
  Quote.hasMany(QuoteLine, { as: 'lines', foreignKey: 'quoteId', ...bare });
  Person.hasMany(PersonSkill, { as: 'skills', foreignKey: 'personId', ...bare });
  WeeklyShift.hasMany(WeeklyShiftPerson, { as: 'people', foreignKey: 'weeklyShiftId', ...bare });
  Shift.hasMany(ShiftPerson, { as: 'people', foreignKey: 'shiftId', ...bare });
  Shift.hasMany(Assignment, { as: 'assignments', foreignKey: 'shiftId', ...bare });
  Task.hasOne(Assignment, { as: 'assignment', foreignKey: 'taskId', ...bare });
  Batch.hasOne(Assignment, { as: 'assignment', foreignKey: 'batchId', ...bare });
  Batch.hasMany(BatchShare, { as: 'shares', foreignKey: 'batchId', ...bare });
  User.hasMany(Identity, { as: 'identities', foreignKey: 'userId', ...bare });
  User.hasMany(Authenticator, { as: 'authenticators', foreignKey: 'userId', ...bare });
  User.hasMany(RecoveryCode, { as: 'recoveryCodes', foreignKey: 'userId', ...bare });
  User.hasMany(Session, { as: 'sessions', foreignKey: 'userId', ...bare });
  User.hasOne(Person, { as: 'person', foreignKey: 'userId', ...bare });
  SentMail.hasMany(MailAttempt, { as: 'tries', foreignKey: 'sentMailId', ...bare });
}
