import path from 'node:path';
import { createCallLog } from '#fakes/harness/call-log.ts';
import { createFailureQueue } from '#fakes/harness/failure-queue.ts';
import { close, createLoopbackApp, listen, portOf } from '#fakes/harness/loopback-app.ts';
import { createCertificate } from './certificate.ts';
import { openMailbox } from './mailbox.ts';
import { createMailboxRoutes } from './mailbox-routes.ts';
import type { SmtpState } from './smtp-listener.ts';
import { listenForMail } from './smtp-listener.ts';
import type { SmtpFailure } from './wire.ts';

export interface SmtpFake {
  /** The mailbox page, without a slash at the end. */
  url: string;
  /** Where mail is sent to: `smtp://127.0.0.1:port`. */
  smtpUrl: string;
  /** With STARTTLS, the self-signed certificate (PEM) a client has to trust. */
  certificate: string | undefined;
  stop(): Promise<void>;
}

/**
 * Starts a mail server on 127.0.0.1 that delivers to a mailbox page. Port 0 takes any free one;
 * with a `dataDir` messages and calls are kept there and messages are back at the next start.
 * Rejects when a port is taken.
 */
export async function start(options: {
  port: number;
  smtpPort: number;
  dataDir?: string;
  startTls?: boolean;
  now?: () => Date;
}): Promise<SmtpFake> {
  const { dataDir } = options;
  const now = options.now ?? (() => new Date());
  const folder = dataDir === undefined ? undefined : path.join(dataDir, 'messages');
  const state: SmtpState = {
    mailbox: await openMailbox({ folder, now }),
    failures: createFailureQueue<SmtpFailure>(),
    calls: createCallLog({ folder: dataDir, now }),
  };
  const tls = options.startTls === true ? createCertificate() : undefined;
  const listener = await listenForMail(state, { port: options.smtpPort, tls });
  const app = createLoopbackApp();
  app.use(createMailboxRoutes(state));
  const server = await listen(app, options.port).catch(async (error: unknown) => {
    await listener.stop();
    throw error;
  });

  return {
    url: `http://127.0.0.1:${portOf(server)}`,
    smtpUrl: `smtp://127.0.0.1:${listener.port}`,
    certificate: tls?.certificate,
    async stop() {
      await Promise.all([listener.stop(), close(server)]);
    },
  };
}
