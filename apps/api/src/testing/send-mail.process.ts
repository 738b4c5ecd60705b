import process from 'node:process';
import { createSmtpClient } from '#api/clients/smtp.ts';
import { openDatabase } from '#api/db/database.ts';
import { createMailHandlers } from '#api/modules/mail/mail-handlers.ts';
import { createMailSender } from '#api/modules/mail/mail-sender.ts';
import { createDispatcher } from '#api/outbox/dispatcher.ts';
import { readEnv } from '#api/platform/env.ts';
import { createLogger } from '#api/platform/logger.ts';
import { TestClock } from './test-clock.ts';

/** Run as a process of its own beside a test, to be killed: carries out events and sends mails. */
const [dataDir = '', smtpUrl = '', now = ''] = process.argv.slice(2);

const clock = new TestClock(now);
const logger = createLogger('silent');
const env = readEnv({ TIERWELL_DATA: dataDir, SMTP_URL: smtpUrl }, 'test');
await openDatabase(dataDir, { clock, logger });
const worker = `worker-${process.pid}`;
createDispatcher({ handlers: createMailHandlers({ clock, env }), clock, logger, worker }).start();
createMailSender({ smtp: createSmtpClient(env.smtp), clock, logger, worker }).start();
