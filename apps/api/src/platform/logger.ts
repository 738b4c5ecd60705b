import { pino, stdSerializers } from 'pino';
import type { DestinationStream, Logger as PinoLogger } from 'pino';

export type Logger = PinoLogger;

export const logLevels = ['trace', 'debug', 'info', 'warn', 'error', 'fatal', 'silent'] as const;
export type LogLevel = (typeof logLevels)[number];

/** Fields that never reach a log, however deep down to three levels. */
const secretFields = [
  'authorization',
  'cookie',
  '["set-cookie"]',
  'password',
  'secret',
  'token',
  'key',
  'claimKey',
  'email',
  'to',
  'phone',
];

const redacted = secretFields.flatMap((field) => {
  const dotted = field.startsWith('[') ? field : `.${field}`;
  return [field, `*${dotted}`, `*.*${dotted}`];
});

const address = /[^\s<>"'(),;:]+@[^\s<>"'(),;:]+/g;

/** Takes e-mail addresses out of text: servers repeat them in their errors. */
export function withoutAddresses(text: string): string {
  return text.replaceAll(address, '[address]');
}

/** What a log keeps of an error's own fields; a database's would tell the row it was given. */
const errorFields = ['code', 'errno', 'syscall', 'command', 'responseCode', 'status'] as const;

function describeError(error: Error): Record<string, unknown> {
  const { type, message, stack, ...rest } = stdSerializers.err(error);
  const fields = new Map<string, unknown>(Object.entries(rest));
  const kept = errorFields.filter((field) => fields.has(field));
  return {
    type,
    message: withoutAddresses(message),
    stack: withoutAddresses(stack),
    ...Object.fromEntries(kept.map((field) => [field, fields.get(field)])),
  };
}

/** A structured log in lines of JSON that holds no secrets, cookies or addresses. */
export function createLogger(level: LogLevel, destination?: DestinationStream): Logger {
  const options = {
    level,
    base: undefined,
    redact: { paths: redacted, censor: '[redacted]' },
    serializers: { err: describeError },
  };
  return destination === undefined ? pino(options) : pino(options, destination);
}
