import type { Migration } from './migration.ts';

/** The ledger, the outbox and e-mail as sent. */
export const moneyAndMail: Migration = {
  name: '0006-money-and-mail',
  sql: `
CREATE TABLE ledger_entries (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  kind TEXT NOT NULL CHECK (kind IN ('charge', 'payment', 'refund', 'credit', 'tip', 'stand-deposit', 'adjustment')),
  amount_minor INTEGER NOT NULL,
  currency TEXT NOT NULL CHECK (length(currency) = 3),
  quote_id TEXT REFERENCES quotes (id),
  payment_attempt_id TEXT REFERENCES payment_attempts (id),
  reverses_entry_id TEXT REFERENCES ledger_entries (id),
  method TEXT CHECK (method IN ('card', 'cash', 'transfer', 'other')),
  reason TEXT,
  by_user_id TEXT REFERENCES users (id),
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX ledger_entries_order_id ON ledger_entries (order_id);
CREATE INDEX ledger_entries_quote_id ON ledger_entries (quote_id) WHERE quote_id IS NOT NULL;
CREATE INDEX ledger_entries_payment_attempt_id ON ledger_entries (payment_attempt_id) WHERE payment_attempt_id IS NOT NULL;
CREATE INDEX ledger_entries_reverses_entry_id ON ledger_entries (reverses_entry_id) WHERE reverses_entry_id IS NOT NULL;
CREATE INDEX ledger_entries_by_user_id ON ledger_entries (by_user_id) WHERE by_user_id IS NOT NULL;
CREATE TRIGGER ledger_entries_no_update BEFORE UPDATE ON ledger_entries
BEGIN SELECT RAISE(ABORT, 'ledger_entries is never changed in place'); END;
CREATE TRIGGER ledger_entries_no_delete BEFORE DELETE ON ledger_entries
BEGIN SELECT RAISE(ABORT, 'ledger_entries is never changed in place'); END;

CREATE TABLE payment_attempts (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  provider TEXT NOT NULL CHECK (provider IN ('stripe', 'counter')),
  provider_ref TEXT UNIQUE,
  purpose TEXT NOT NULL CHECK (purpose IN ('deposit', 'balance', 'other')),
  amount_minor INTEGER NOT NULL CHECK (amount_minor >= 0),
  currency TEXT NOT NULL CHECK (length(currency) = 3),
  state TEXT NOT NULL CHECK (state IN ('created', 'pending', 'succeeded', 'failed', 'cancelled')),
  failure_code TEXT,
  unique_key TEXT NOT NULL UNIQUE,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  updated_at TEXT NOT NULL CHECK (updated_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX payment_attempts_order_id ON payment_attempts (order_id);

CREATE TABLE webhook_events (
  id TEXT NOT NULL PRIMARY KEY,
  provider TEXT NOT NULL CHECK (provider IN ('stripe')),
  kind TEXT NOT NULL,
  payload TEXT NOT NULL CHECK (json_valid(payload)),
  received_at TEXT NOT NULL CHECK (received_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  processed_at TEXT CHECK (processed_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  last_error TEXT
) STRICT;

CREATE TABLE outbox (
  id INTEGER PRIMARY KEY AUTOINCREMENT,
  kind TEXT NOT NULL,
  payload TEXT NOT NULL CHECK (json_valid(payload)),
  unique_key TEXT NOT NULL UNIQUE,
  order_id TEXT REFERENCES orders (id),
  state TEXT NOT NULL DEFAULT 'queued' CHECK (state IN ('queued', 'leased', 'done', 'given-up')),
  attempts INTEGER NOT NULL DEFAULT 0 CHECK (attempts >= 0),
  next_at TEXT NOT NULL CHECK (next_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  leased_until TEXT CHECK (leased_until GLOB '????-??-?? ??:??:??.??? +00:00'),
  leased_by TEXT,
  last_error TEXT,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  done_at TEXT CHECK (done_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK ((state = 'leased') = (leased_until IS NOT NULL))
) STRICT;
CREATE INDEX outbox_next_at ON outbox (next_at) WHERE state IN ('queued', 'leased');
CREATE INDEX outbox_order_id_id ON outbox (order_id, id) WHERE state IN ('queued', 'leased');
CREATE INDEX outbox_order_id ON outbox (order_id) WHERE order_id IS NOT NULL;

CREATE TABLE sent_mail (
  id INTEGER PRIMARY KEY AUTOINCREMENT,
  outbox_id INTEGER REFERENCES outbox (id),
  template TEXT NOT NULL,
  order_id TEXT REFERENCES orders (id),
  user_id TEXT REFERENCES users (id),
  token_id TEXT REFERENCES tokens (id),
  resend_of_id INTEGER REFERENCES sent_mail (id),
  from_address TEXT NOT NULL,
  to_address TEXT NOT NULL,
  reply_to TEXT,
  subject TEXT NOT NULL,
  html TEXT NOT NULL,
  text TEXT NOT NULL,
  attachments TEXT NOT NULL CHECK (json_valid(attachments)),
  message_id TEXT NOT NULL UNIQUE,
  in_reply_to TEXT,
  thread_references TEXT NOT NULL DEFAULT '',
  unique_key TEXT NOT NULL UNIQUE,
  state TEXT NOT NULL DEFAULT 'queued' CHECK (state IN ('queued', 'leased', 'sent', 'given-up', 'dropped')),
  attempts INTEGER NOT NULL DEFAULT 0 CHECK (attempts >= 0),
  next_at TEXT NOT NULL CHECK (next_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  leased_until TEXT CHECK (leased_until GLOB '????-??-?? ??:??:??.??? +00:00'),
  leased_by TEXT,
  last_error TEXT,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  sent_at TEXT CHECK (sent_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  erased_at TEXT CHECK (erased_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK ((state = 'leased') = (leased_until IS NOT NULL))
) STRICT;
CREATE INDEX sent_mail_next_at ON sent_mail (next_at) WHERE state IN ('queued', 'leased');
CREATE INDEX sent_mail_order_id_id ON sent_mail (order_id, id);
CREATE INDEX sent_mail_outbox_id ON sent_mail (outbox_id) WHERE outbox_id IS NOT NULL;
CREATE INDEX sent_mail_order_id ON sent_mail (order_id) WHERE order_id IS NOT NULL;
CREATE INDEX sent_mail_user_id ON sent_mail (user_id) WHERE user_id IS NOT NULL;
CREATE INDEX sent_mail_token_id ON sent_mail (token_id) WHERE token_id IS NOT NULL;
CREATE INDEX sent_mail_resend_of_id ON sent_mail (resend_of_id) WHERE resend_of_id IS NOT NULL;

CREATE TABLE mail_attempts (
  id TEXT NOT NULL PRIMARY KEY,
  sent_mail_id INTEGER NOT NULL REFERENCES sent_mail (id),
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00'),
  outcome TEXT NOT NULL CHECK (outcome IN ('sent', 'deferred', 'refused', 'unreachable')),
  response TEXT NOT NULL
) STRICT;
CREATE INDEX mail_attempts_sent_mail_id ON mail_attempts (sent_mail_id);

CREATE TABLE worker_beats (
  name TEXT NOT NULL PRIMARY KEY,
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE applied_seeders (
  name TEXT NOT NULL PRIMARY KEY,
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
`,
};
