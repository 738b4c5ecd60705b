import { createHash } from 'node:crypto';
import { createTransport } from 'nodemailer';

export type SmtpSettings = {
  /** `smtp://` or `smtps://`, with user and password where the server wants them. */
  readonly url: string;
  /** Refuses to send where the server offers no STARTTLS. */
  readonly requireTls: boolean;
  /** A certificate (PEM) to trust besides the system's. */
  readonly trust?: string;
};

export type SmtpMessage = {
  /** With its angle brackets. */
  readonly messageId: string;
  readonly date: Date;
  /** `Name <address>` or an address. */
  readonly from: string;
  /** One address. */
  readonly to: string;
  readonly replyTo: string | null;
  readonly subject: string;
  readonly html: string;
  readonly text: string;
  readonly inReplyTo: string | null;
  readonly references: readonly string[];
  readonly attachments: readonly {
    readonly filename: string;
    readonly contentType: string;
    readonly base64: string;
  }[];
};

/**
 * - `sent`: the server has taken the message;
 * - `deferred`: not now (4xx);
 * - `refused`: never (5xx);
 * - `unreachable`: nothing was said about the message, which may still have arrived: no connection,
 *   no answer in time, no TLS, or the server does not know us.
 */
export type SmtpOutcome = 'sent' | 'deferred' | 'refused' | 'unreachable';

export type SmtpAnswer = {
  readonly outcome: SmtpOutcome;
  /** What the server said, or what went wrong; may hold addresses. */
  readonly response: string;
};

export type SmtpClient = {
  /** Never rejects: what went wrong is an outcome. */
  send(message: SmtpMessage): Promise<SmtpAnswer>;
};

/** The whole conversation about one message, milliseconds; within a row's lease. */
const patienceMs = 90_000;
/** One answer of the server, milliseconds. */
const answerMs = 60_000;

/** Commands whose answer is about the message; to others the server says what it thinks of us. */
const aboutTheMessage = ['MAIL FROM', 'RCPT TO', 'DATA'];
/** Replies that ask for a password or for TLS (RFC 3207, RFC 4954), whenever they come. */
const aboutUs = [530, 534, 535, 538];

/** Hands messages to the studio's mail server, one connection each. */
export function createSmtpClient({ url, requireTls, trust }: SmtpSettings): SmtpClient {
  const transport = createTransport({
    url,
    requireTLS: requireTls,
    tls: trust === undefined ? undefined : { ca: trust },
    connectionTimeout: answerMs,
    greetingTimeout: answerMs,
    socketTimeout: answerMs,
    disableFileAccess: true,
    disableUrlAccess: true,
  });

  return {
    async send(message) {
      try {
        const info = await transport.sendMail({
          ...composed(message),
          signal: AbortSignal.timeout(patienceMs),
        });
        return { outcome: 'sent', response: info.response };
      } catch (error) {
        return answerOf(error);
      }
    },
  };
}

/** Nothing in it is left to chance or to the hour, so that every attempt sends the same bytes. */
function composed(message: SmtpMessage) {
  const { messageId, date, from, to, replyTo, subject, html, text, inReplyTo } = message;
  return {
    messageId,
    date,
    from,
    // An address taken apart already is not read again, so that none can hide another in it.
    to: { name: '', address: to },
    replyTo: replyTo === null ? undefined : { name: '', address: replyTo },
    subject,
    text,
    html,
    inReplyTo: inReplyTo ?? undefined,
    references: [...message.references],
    attachments: message.attachments.map(({ filename, contentType, base64 }) => ({
      filename,
      contentType,
      content: base64,
      encoding: 'base64',
    })),
    // RFC 3834: an out-of-office program does not answer.
    headers: { 'Auto-Submitted': 'auto-generated' },
    xMailer: false as const,
    baseBoundary: createHash('sha256').update(messageId).digest('hex').slice(0, 24),
  };
}

/** What nodemailer adds to its errors. */
type Failure = Error & {
  readonly code?: unknown;
  readonly command?: unknown;
  readonly responseCode?: unknown;
  readonly permanent?: unknown;
};

function answerOf(error: unknown): SmtpAnswer {
  if (!(error instanceof Error)) return { outcome: 'unreachable', response: String(error) };
  return { outcome: outcomeOf(error), response: error.message };
}

function outcomeOf({ code, command, responseCode, permanent }: Failure): SmtpOutcome {
  if (typeof responseCode !== 'number') {
    // An address or a size that the server's own words rule out, found before it was asked.
    return code === 'EENVELOPE' || code === 'EMESSAGE' ? 'refused' : 'unreachable';
  }
  const about = typeof command === 'string' && aboutTheMessage.includes(command);
  if (!about || aboutUs.includes(responseCode)) return 'unreachable';
  return permanent === true ? 'refused' : 'deferred';
}
