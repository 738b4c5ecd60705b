import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { newCareCode } from '#api/platform/ids.ts';
import {
  flag,
  instant,
  integer,
  json,
  key,
  nullable,
  oneOf,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import { orderTerms } from '../json-shapes.ts';
import type { OrderTerms } from '../json-shapes.ts';
import type { Consent } from './consent.ts';
import type { Handover } from './handover.ts';
import type { Hold } from './hold.ts';
import type { LedgerEntry } from './ledger-entry.ts';
import type { LiftedStop } from './lifted-stop.ts';
import type { Message } from './message.ts';
import type { Occasion } from './occasion.ts';
import type { OrderContact } from './order-contact.ts';
import type { OrderEvent } from './order-event.ts';
import type { OrderRevision } from './order-revision.ts';
import type { Photo } from './photo.ts';
import type { Quote } from './quote.ts';
import type { SentMail } from './sent-mail.ts';
import type { Task } from './task.ts';
import type { User } from './user.ts';

export const dateAnswerKepts = ['open', 'last-place', 'ask-us'] as const;
export type DateAnswerKept = (typeof dateAnswerKepts)[number];

export const endedBies = ['customer', 'studio', 'time'] as const;
export type EndedBy = (typeof endedBies)[number];

/** What one customer asks for, for one day. Only the table of moves writes its status. */
export class Order extends Model<InferAttributes<Order>, InferCreationAttributes<Order>> {
  declare id: CreationOptional<string>;
  declare number: number;
  /** In addresses; grants nothing. */
  declare code: string;
  /** Opens the page about the cake alone: no name, price or contact. */
  declare careCode: CreationOptional<string | null>;
  /** What the owner has said may be printed as "not known"; anything else stops a label again. */
  declare unknownConfirmed: string | null;
  declare status: OrderStatus;
  declare rowVersion: CreationOptional<number>;
  declare currentRevisionId: string | null;
  declare agreedRevisionId: string | null;
  declare customerUserId: string | null;
  declare occasionId: string;
  declare currency: string;
  declare terms: OrderTerms;
  /** Local; null while a confirmed order has lost its day. */
  declare pickupDate: string | null;
  declare windowStartMinute: number | null;
  declare windowMinutes: number | null;
  /** As it was when the pickup was promised. */
  declare zone: string;
  /** Derived: start of the window. */
  declare pickupAt: Date | null;
  declare dateAnswer: DateAnswerKept;
  declare privateKeyHash: string | null;
  declare keyRenewedAt: Date | null;
  /** The link of the first e-mail, which lengthens a guest's hold. */
  declare linkOpenedAt: Date | null;
  declare showPhotos: CreationOptional<boolean>;
  /** Of the network address, to limit unanswered holds. */
  declare sentFromHash: string | null;
  declare confirmedAt: Date | null;
  declare endedAt: Date | null;
  declare endedBy: EndedBy | null;
  declare endedReason: string | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  declare currentRevision?: NonAttribute<OrderRevision | null>;
  declare agreedRevision?: NonAttribute<OrderRevision | null>;
  declare customer?: NonAttribute<User | null>;
  declare occasion?: NonAttribute<Occasion>;
  declare revisions?: NonAttribute<OrderRevision[]>;
  declare contacts?: NonAttribute<OrderContact[]>;
  declare messages?: NonAttribute<Message[]>;
  declare photos?: NonAttribute<Photo[]>;
  declare events?: NonAttribute<OrderEvent[]>;
  declare quotes?: NonAttribute<Quote[]>;
  declare holds?: NonAttribute<Hold[]>;
  declare tasks?: NonAttribute<Task[]>;
  declare handovers?: NonAttribute<Handover[]>;
  declare mails?: NonAttribute<SentMail[]>;
  declare consents?: NonAttribute<Consent[]>;
  declare liftedStops?: NonAttribute<LiftedStop[]>;
  declare ledgerEntries?: NonAttribute<LedgerEntry[]>;
}

export function initOrder(sequelize: Sequelize): void {
  Order.init(
    {
      id: key(),
      number: integer(),
      code: text(),
      careCode: { ...nullable(text()), defaultValue: newCareCode },
      unknownConfirmed: nullable(text()),
      status: oneOf(orderStatuses),
      rowVersion: withDefault(integer(), 1),
      currentRevisionId: nullable(text()),
      agreedRevisionId: nullable(text()),
      customerUserId: nullable(text()),
      occasionId: text(),
      currency: text(),
      terms: json('terms', orderTerms),
      pickupDate: nullable(text()),
      windowStartMinute: nullable(integer()),
      windowMinutes: nullable(integer()),
      zone: text(),
      pickupAt: nullable(instant('pickupAt')),
      dateAnswer: oneOf(dateAnswerKepts),
      privateKeyHash: nullable(text()),
      keyRenewedAt: nullable(instant('keyRenewedAt')),
      linkOpenedAt: nullable(instant('linkOpenedAt')),
      showPhotos: withDefault(flag('showPhotos'), false),
      sentFromHash: nullable(text()),
      confirmedAt: nullable(instant('confirmedAt')),
      endedAt: nullable(instant('endedAt')),
      endedBy: nullable(oneOf(endedBies)),
      endedReason: nullable(text()),
      createdAt: writtenAt('createdAt'),
      updatedAt: writtenAt('updatedAt'),
    },
    { sequelize, tableName: 'orders' },
  );
}
