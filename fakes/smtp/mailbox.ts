import {
  appendFileSync,
  existsSync,
  mkdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import type { AddressObject, Attachment, ParsedMail } from 'mailparser';
import { simpleParser } from 'mailparser';
import * as z from 'zod/mini';
import type { MailMessage, MessageFilter } from './wire.ts';

/** What the envelope says, which the message itself may not. */
export interface Envelope {
  sender: string;
  to: string[];
}

interface Kept {
  message: MailMessage;
  raw: Buffer;
  attachments: Attachment[];
}

export interface Mailbox {
  /** Takes a message apart and keeps it, on disk too where the mailbox has a folder. */
  receive(raw: Buffer, envelope: Envelope): Promise<MailMessage>;
  /** Messages that fit the filter, oldest first. */
  list(filter: MessageFilter): MailMessage[];
  find(id: string): Kept | undefined;
  clear(): void;
}

const indexLine = z.object({
  id: z.string(),
  receivedAt: z.string(),
  sender: z.string(),
  to: z.array(z.string()),
});

function addressText(address: AddressObject | AddressObject[] | undefined): string {
  return [address ?? []]
    .flat()
    .map((one) => one.text)
    .join(', ');
}

/** Unfolds a header line (RFC 5322, 2.2.3) into its name and value. */
function header({ line }: { line: string }): { name: string; value: string } {
  const colon = line.indexOf(':');
  return {
    name: line.slice(0, colon),
    value: line
      .slice(colon + 1)
      .replace(/\r?\n(?=[ \t])/g, '')
      .trim(),
  };
}

function described(parsed: ParsedMail, kept: z.infer<typeof indexLine>): MailMessage {
  return {
    ...kept,
    from: addressText(parsed.from),
    subject: parsed.subject ?? '',
    messageId: parsed.messageId ?? '',
    inReplyTo: parsed.inReplyTo ?? '',
    references: [parsed.references ?? []].flat(),
    text: parsed.text ?? '',
    html: parsed.html === false ? null : (parsed.html ?? null),
    headers: parsed.headerLines.map(header),
    attachments: parsed.attachments.map((attachment, index) => ({
      filename: attachment.filename ?? `attachment-${index + 1}`,
      contentType: attachment.contentType,
      size: attachment.size,
      inline: attachment.related ?? false,
    })),
  };
}

function fits(message: MailMessage, { to, subject, since }: MessageFilter): boolean {
  return (
    (to === undefined ||
      message.to.some((address) => address.toLowerCase() === to.toLowerCase())) &&
    (subject === undefined || message.subject.toLowerCase().includes(subject.toLowerCase())) &&
    (since === undefined || message.receivedAt >= since)
  );
}

/**
 * Opens the mailbox in a folder with what it kept before, or an empty one in memory. On disk each
 * message is the bytes that arrived (`<id>.eml`) and a line in `index.jsonl` with its envelope.
 */
export async function openMailbox(options: {
  folder: string | undefined;
  now: () => Date;
}): Promise<Mailbox> {
  const { folder, now } = options;
  const index = folder === undefined ? undefined : path.join(folder, 'index.jsonl');
  let kept: Kept[] = [];
  let lastId = 0;

  async function keep(raw: Buffer, line: z.infer<typeof indexLine>): Promise<MailMessage> {
    const parsed = await simpleParser(raw);
    const message = described(parsed, line);
    kept.push({ message, raw, attachments: parsed.attachments });
    return message;
  }

  if (folder !== undefined) mkdirSync(folder, { recursive: true });
  if (folder !== undefined && index !== undefined && existsSync(index)) {
    for (const text of readFileSync(index, 'utf8').split('\n')) {
      if (text === '') continue;
      const line = indexLine.parse(JSON.parse(text));
      await keep(readFileSync(path.join(folder, `${line.id}.eml`)), line);
      lastId = Math.max(lastId, Number(line.id));
    }
  }

  return {
    async receive(raw, envelope) {
      lastId += 1;
      const line = {
        id: String(lastId),
        receivedAt: now().toISOString(),
        ...envelope,
      };
      if (folder !== undefined && index !== undefined) {
        writeFileSync(path.join(folder, `${line.id}.eml`), raw);
        appendFileSync(index, `${JSON.stringify(line)}\n`);
      }
      return keep(raw, line);
    },

    list(filter) {
      return kept.map(({ message }) => message).filter((message) => fits(message, filter));
    },

    find(id) {
      return kept.find(({ message }) => message.id === id);
    },

    clear() {
      if (folder !== undefined && index !== undefined) {
        for (const { message } of kept) rmSync(path.join(folder, `${message.id}.eml`));
        rmSync(index, { force: true });
      }
      kept = [];
    },
  };
}
