import { Model } from 'sequelize';
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  Sequelize,
} from 'sequelize';
import { instant, json, nullable, oneOf, text, writtenAt } from '../columns.ts';
import { jsonObject } from '../json-shapes.ts';
import type { JsonObject } from '../json-shapes.ts';

export const webhookProviders = ['stripe'] as const;
export type WebhookProvider = (typeof webhookProviders)[number];

/** An event another service told us, by its own id. */
export class WebhookEvent extends Model<
  InferAttributes<WebhookEvent>,
  InferCreationAttributes<WebhookEvent>
> {
  declare id: string;
  declare provider: WebhookProvider;
  declare kind: string;
  declare payload: JsonObject;
  declare receivedAt: CreationOptional<Date>;
  declare processedAt: Date | null;
  declare lastError: string | null;
}

export function initWebhookEvent(sequelize: Sequelize): void {
  WebhookEvent.init(
    {
      id: { ...text(), primaryKey: true },
      provider: oneOf(webhookProviders),
      kind: text(),
      payload: json('payload', jsonObject),
      receivedAt: writtenAt('receivedAt'),
      processedAt: nullable(instant('processedAt')),
      lastError: nullable(text()),
    },
    { sequelize, tableName: 'webhook_events' },
  );
}
