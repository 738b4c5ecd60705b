import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize';
import {
  countedKey,
  instant,
  integer,
  json,
  nullable,
  oneOf,
  text,
  withDefault,
  writtenAt,
} from '../columns.ts';
import { mailAttachments } from '../json-shapes.ts';
import type { MailAttachment } from '../json-shapes.ts';
import type { MailAttempt } from './mail-attempt.ts';
import type { Order } from './order.ts';

export const sentMailStates = ['queued', 'leased', 'sent', 'given-up', 'dropped'] as const;
export type SentMailState = (typeof sentMailStates)[number];

/** An e-mail exactly as rendered, before it is sent. Retries send the same bytes. */
export class SentMail extends Model<InferAttributes<SentMail>, InferCreationAttributes<SentMail>> {
  declare id: CreationOptional<number>;
  declare outboxId: number | null;
  declare template: string;
  declare orderId: string | null;
  declare userId: string | null;
  /** Spent or run out: the mail is dropped. */
  declare tokenId: string | null;
  declare resendOfId: number | null;
  declare fromAddress: string;
  declare toAddress: string;
  declare replyTo: string | null;
  declare subject: string;
  declare html: string;
  declare text: string;
  declare attachments: MailAttachment[];
  declare messageId: string;
  declare inReplyTo: string | null;
  declare threadReferences: CreationOptional<string>;
  declare uniqueKey: string;
  declare state: CreationOptional<SentMailState>;
  declare attempts: CreationOptional<number>;
  declare nextAt: Date;
  declare leasedUntil: Date | null;
  declare leasedBy: string | null;
  declare lastError: string | null;
  declare createdAt: CreationOptional<Date>;
  declare sentAt: Date | null;
  declare erasedAt: Date | null;

  declare order?: NonAttribute<Order | null>;
  declare tries?: NonAttribute<MailAttempt[]>;
}

export function initSentMail(sequelize: Sequelize): void {
  SentMail.init(
    {
      id: countedKey(),
      outboxId: nullable(integer()),
      template: text(),
      orderId: nullable(text()),
      userId: nullable(text()),
      tokenId: nullable(text()),
      resendOfId: nullable(integer()),
      fromAddress: text(),
      toAddress: text(),
      replyTo: nullable(text()),
      subject: text(),
      html: text(),
      text: text(),
      attachments: json('attachments', mailAttachments),
      messageId: text(),
      inReplyTo: nullable(text()),
      threadReferences: withDefault(text(), ''),
      uniqueKey: text(),
      state: withDefault(oneOf(sentMailStates), 'queued'),
      attempts: withDefault(integer(), 0),
      nextAt: instant('nextAt'),
      leasedUntil: nullable(instant('leasedUntil')),
      leasedBy: nullable(text()),
      lastError: nullable(text()),
      createdAt: writtenAt('createdAt'),
      sentAt: nullable(instant('sentAt')),
      erasedAt: nullable(instant('erasedAt')),
    },
    { sequelize, tableName: 'sent_mail' },
  );
}
