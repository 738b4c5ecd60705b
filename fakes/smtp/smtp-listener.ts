import { once } from 'node:events';
import type { Socket } from 'node:net';
import { buffer } from 'node:stream/consumers';
import { setTimeout as pause } from 'node:timers/promises';
import { SMTPServer } from 'smtp-server';
import type { CallLog } from '#fakes/harness/call-log.ts';
import type { FailureQueue } from '#fakes/harness/failure-queue.ts';
import { portOf } from '#fakes/harness/loopback-app.ts';
import type { Mailbox } from './mailbox.ts';
import type { SmtpCall, SmtpFailure } from './wire.ts';

/** More than the largest message the studio sends: ten megabytes. */
const largestMessageBytes = 10 * 1024 * 1024;

export interface SmtpState {
  mailbox: Mailbox;
  failures: FailureQueue<SmtpFailure>;
  calls: CallLog<Omit<SmtpCall, 'n' | 'at'>>;
}

export interface SmtpListener {
  port: number;
  stop(): Promise<void>;
}

/** An error that smtp-server turns into this reply. */
function reply(code: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode: code });
}

/** Fits a planned failure of this kind that names one of the recipients, or none. */
function planned<Kind extends SmtpFailure['kind']>(kind: Kind, recipients: string[]) {
  return (failure: SmtpFailure): failure is Extract<SmtpFailure, { kind: Kind }> => {
    if (failure.kind !== kind) return false;
    const only = 'recipient' in failure ? failure.recipient?.toLowerCase() : undefined;
    return only === undefined || recipients.some((address) => address.toLowerCase() === only);
  };
}

/**
 * Listens for SMTP on 127.0.0.1 and keeps what arrives. With a certificate STARTTLS is offered;
 * without one it is not announced, so clients that upgrade when they can stay in plain text.
 */
export async function listenForMail(
  state: SmtpState,
  options: {
    port: number;
    tls: { certificate: string; key: string } | undefined;
  },
): Promise<SmtpListener> {
  const { mailbox, failures, calls } = state;
  const sockets = new Map<number, Socket>();

  const server = new SMTPServer({
    name: 'localhost',
    banner: 'Stand-in, keeps every message on this computer',
    disabledCommands: options.tls === undefined ? ['AUTH', 'STARTTLS'] : ['AUTH'],
    disableReverseLookup: true,
    size: largestMessageBytes,
    closeTimeout: 20,
    ...(options.tls === undefined ? {} : { cert: options.tls.certificate, key: options.tls.key }),

    onConnect({ secure: tls }, callback) {
      const failure = failures.take(planned('refuse-connection', []));
      if (failure === undefined) return callback();
      const { code } = failure;
      const outcome = code < 500 ? 'deferred' : 'refused';
      calls.add({ step: 'connect', outcome, code, tls, to: [] });
      callback(reply(code, 'Refused on request'));
    },

    onRcptTo({ address }, { secure: tls }, callback) {
      const failure =
        failures.take(planned('refuse', [address])) ?? failures.take(planned('defer', [address]));
      if (failure === undefined) return callback();
      const { code } = failure;
      const outcome = failure.kind === 'defer' ? 'deferred' : 'refused';
      calls.add({ step: 'recipient', outcome, code, tls, to: [address] });
      callback(reply(code, 'Refused on request'));
    },

    onData(stream, session, callback) {
      const { secure: tls, envelope } = session;
      const to = envelope.rcptTo.map(({ address }) => address);
      const sender = envelope.mailFrom === false ? '' : envelope.mailFrom.address;

      async function receive(): Promise<void> {
        const raw = await buffer(stream);
        if (stream.sizeExceeded) {
          calls.add({
            step: 'message',
            outcome: 'refused',
            code: 552,
            tls,
            to,
          });
          callback(reply(552, 'The message is too large'));
          return;
        }
        const slow = failures.take(planned('slow', to));
        if (slow !== undefined) await pause(slow.ms);
        const { messageId } = await mailbox.receive(raw, { sender, to });
        if (failures.take(planned('drop-after-data', to)) !== undefined) {
          calls.add({
            step: 'message',
            outcome: 'dropped',
            code: 0,
            tls,
            to,
            messageId,
          });
          sockets.get(session.remotePort)?.destroy();
          return;
        }
        calls.add({
          step: 'message',
          outcome: 'accepted',
          code: 250,
          tls,
          to,
          messageId,
        });
        callback();
      }

      receive().catch((error: unknown) => {
        callback(reply(451, error instanceof Error ? error.message : 'The mailbox failed'));
      });
    },
  });
  // Clients that vanish in the middle are what some tests are about; they are no fault of ours.
  server.on('error', () => undefined);
  server.server.on('connection', (socket: Socket) => {
    const port = socket.remotePort ?? 0;
    sockets.set(port, socket);
    socket.once('close', () => sockets.delete(port));
  });

  server.listen(options.port, '127.0.0.1');
  await once(server.server, 'listening');

  return {
    port: portOf(server.server),
    async stop() {
      for (const socket of sockets.values()) socket.destroy();
      await new Promise<void>((resolve) => {
        server.close(resolve);
      });
    },
  };
}
