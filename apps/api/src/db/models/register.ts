import type { Sequelize } from 'sequelize';
import { associateModels } from './associations.ts';
import { initAllergyRule } from './allergy-rule.ts';
import { initAppliedSeeder } from './applied-seeder.ts';
import { initAssignment } from './assignment.ts';
import { initAudit } from './audit.ts';
import { initAuthenticator } from './authenticator.ts';
import { initBatch } from './batch.ts';
import { initBatchShare } from './batch-share.ts';
import { initButtercreamStyle } from './buttercream-style.ts';
import { initClosure } from './closure.ts';
import { initColdPlace } from './cold-place.ts';
import { initConsent } from './consent.ts';
import { initContentChange } from './content-change.ts';
import { initCovering } from './covering.ts';
import { initCoveringFinish } from './covering-finish.ts';
import { initDayCap } from './day-cap.ts';
import { initDeclaredAllergy } from './declared-allergy.ts';
import { initDeclaredDiet } from './declared-diet.ts';
import { initDecoration } from './decoration.ts';
import { initDecorationIngredient } from './decoration-ingredient.ts';
import { initEmailText } from './email-text.ts';
import { initEquipment } from './equipment.ts';
import { initExtra } from './extra.ts';
import { initFilling } from './filling.ts';
import { initFinish } from './finish.ts';
import { initFormula } from './formula.ts';
import { initFormulaLine } from './formula-line.ts';
import { initFormulaStep } from './formula-step.ts';
import { initFormulaVersion } from './formula-version.ts';
import { initHandover } from './handover.ts';
import { initHold } from './hold.ts';
import { initIdempotencyKey } from './idempotency-key.ts';
import { initIdentity } from './identity.ts';
import { initIngredient } from './ingredient.ts';
import { initIngredientAllergen } from './ingredient-allergen.ts';
import { initIngredientMeasure } from './ingredient-measure.ts';
import { initItemColour } from './item-colour.ts';
import { initItemDecoration } from './item-decoration.ts';
import { initItemTier } from './item-tier.ts';
import { initKitchenAllergen } from './kitchen-allergen.ts';
import { initLedgerEntry } from './ledger-entry.ts';
import { initLiftedStop } from './lifted-stop.ts';
import { initMailAttempt } from './mail-attempt.ts';
import { initMessage } from './message.ts';
import { initNoticeRule } from './notice-rule.ts';
import { initOccasion } from './occasion.ts';
import { initOrder } from './order.ts';
import { initOrderContact } from './order-contact.ts';
import { initOrderEvent } from './order-event.ts';
import { initOrderItem } from './order-item.ts';
import { initOrderRevision } from './order-revision.ts';
import { initOutboxRow } from './outbox-row.ts';
import { initPaymentAttempt } from './payment-attempt.ts';
import { initPerson } from './person.ts';
import { initPersonSkill } from './person-skill.ts';
import { initPhoto } from './photo.ts';
import { initPickupWindow } from './pickup-window.ts';
import { initPlanState } from './plan-state.ts';
import { initPolicyVersion } from './policy-version.ts';
import { initPortionSize } from './portion-size.ts';
import { initPriceBookVersion } from './price-book-version.ts';
import { initQuote } from './quote.ts';
import { initQuoteLine } from './quote-line.ts';
import { initRecoveryCode } from './recovery-code.ts';
import { initRevisionFormulaVersion } from './revision-formula-version.ts';
import { initRevisionPolicyVersion } from './revision-policy-version.ts';
import { initSavedView } from './saved-view.ts';
import { initSentMail } from './sent-mail.ts';
import { initSession } from './session.ts';
import { initSheetSize } from './sheet-size.ts';
import { initShift } from './shift.ts';
import { initShiftPerson } from './shift-person.ts';
import { initSignInFailure } from './sign-in-failure.ts';
import { initSkill } from './skill.ts';
import { initSponge } from './sponge.ts';
import { initStopTalk } from './stop-talk.ts';
import { initStudio } from './studio.ts';
import { initTask } from './task.ts';
import { initTaskLink } from './task-link.ts';
import { initTierSize } from './tier-size.ts';
import { initToken } from './token.ts';
import { initUser } from './user.ts';
import { initWebhookEvent } from './webhook-event.ts';
import { initWeeklyPickupWindow } from './weekly-pickup-window.ts';
import { initWeeklyShift } from './weekly-shift.ts';
import { initWeeklyShiftPerson } from './weekly-shift-person.ts';
import { initWorkTimeVersion } from './work-time-version.ts';
import { initWorkerBeat } from './worker-beat.ts';

const initialisers = [
  initAllergyRule,
  initAppliedSeeder,
  initAssignment,
  initAudit,
  initAuthenticator,
  initBatch,
  initBatchShare,
  initButtercreamStyle,
  initClosure,
  initColdPlace,
  initConsent,
  initContentChange,
  initCovering,
  initCoveringFinish,
  initDayCap,
  initDeclaredAllergy,
  initDeclaredDiet,
  initDecoration,
  initDecorationIngredient,
  initEmailText,
  initEquipment,
  initExtra,
  initFilling,
  initFinish,
  initFormula,
  initFormulaLine,
  initFormulaStep,
  initFormulaVersion,
  initHandover,
  initHold,
  initIdempotencyKey,
  initIdentity,
  initIngredient,
  initIngredientAllergen,
  initIngredientMeasure,
  initItemColour,
  initItemDecoration,
  initItemTier,
  initKitchenAllergen,
  initLedgerEntry,
  initLiftedStop,
  initMailAttempt,
  initMessage,
  initNoticeRule,
  initOccasion,
  initOrder,
  initOrderContact,
  initOrderEvent,
  initOrderItem,
  initOrderRevision,
  initOutboxRow,
  initPaymentAttempt,
  initPerson,
  initPersonSkill,
  initPhoto,
  initPickupWindow,
  initPlanState,
  initPolicyVersion,
  initPortionSize,
  initPriceBookVersion,
  initQuote,
  initQuoteLine,
  initRecoveryCode,
  initRevisionFormulaVersion,
  initRevisionPolicyVersion,
  initSavedView,
  initSentMail,
  initSession,
  initSheetSize,
  initShift,
  initShiftPerson,
  initSignInFailure,
  initSkill,
  initSponge,
  initStopTalk,
  initStudio,
  initTask,
  initTaskLink,
  initTierSize,
  initToken,
  initUser,
  initWebhookEvent,
  initWeeklyPickupWindow,
  initWeeklyShift,
  initWeeklyShiftPerson,
  initWorkTimeVersion,
  initWorkerBeat,
];

/** Binds every model to one database, and the models to each other. */
export function registerModels(sequelize: Sequelize): void {
  for (const initialise of initialisers) initialise(sequelize);
  associateModels();
}
