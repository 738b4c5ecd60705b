import type { Migration } from './migration.ts';

/** Accounts, proof and consent. */
export const people: Migration = {
  name: '0005-people',
  sql: `
CREATE TABLE users (
  id TEXT NOT NULL PRIMARY KEY,
  email TEXT UNIQUE,
  name TEXT NOT NULL,
  phone TEXT,
  role TEXT NOT NULL CHECK (role IN ('customer', 'counter', 'baker', 'owner')),
  password_hash TEXT,
  email_proven_at TEXT CHECK (email_proven_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  last_signed_in_at TEXT CHECK (last_signed_in_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  ended_at TEXT CHECK (ended_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  erased_at TEXT CHECK (erased_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK (email IS NULL OR email = lower(email))
) STRICT;

CREATE TABLE identities (
  id TEXT NOT NULL PRIMARY KEY,
  user_id TEXT NOT NULL REFERENCES users (id),
  provider TEXT NOT NULL CHECK (provider IN ('google')),
  subject TEXT NOT NULL,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  last_used_at TEXT CHECK (last_used_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (provider, subject)
) STRICT;
CREATE INDEX identities_user_id ON identities (user_id);

CREATE TABLE tokens (
  id TEXT NOT NULL PRIMARY KEY,
  hash TEXT NOT NULL UNIQUE,
  purpose TEXT NOT NULL CHECK (purpose IN ('sign-in', 'invitation', 'password-reset', 'first-owner', 'confirm-action')),
  user_id TEXT REFERENCES users (id),
  email TEXT,
  role TEXT CHECK (role IN ('customer', 'counter', 'baker', 'owner')),
  data TEXT NOT NULL CHECK (json_valid(data)),
  expires_at TEXT NOT NULL CHECK (expires_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  used_at TEXT CHECK (used_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_by_user_id TEXT REFERENCES users (id)
) STRICT;
CREATE INDEX tokens_user_id ON tokens (user_id) WHERE user_id IS NOT NULL;
CREATE INDEX tokens_email ON tokens (email) WHERE email IS NOT NULL;
CREATE INDEX tokens_expires_at ON tokens (expires_at);
CREATE INDEX tokens_created_by_user_id ON tokens (created_by_user_id) WHERE created_by_user_id IS NOT NULL;

CREATE TABLE authenticators (
  id TEXT NOT NULL PRIMARY KEY,
  user_id TEXT NOT NULL REFERENCES users (id),
  kind TEXT NOT NULL CHECK (kind IN ('totp', 'passkey')),
  label TEXT NOT NULL DEFAULT '',
  secret_encrypted TEXT,
  credential_id TEXT UNIQUE,
  public_key TEXT,
  sign_count INTEGER NOT NULL DEFAULT 0 CHECK (sign_count >= 0),
  last_step INTEGER,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  confirmed_at TEXT CHECK (confirmed_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  last_used_at TEXT CHECK (last_used_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK (kind <> 'totp' OR secret_encrypted IS NOT NULL),
  CHECK (kind <> 'passkey' OR (credential_id IS NOT NULL AND public_key IS NOT NULL))
) STRICT;
CREATE INDEX authenticators_user_id ON authenticators (user_id);

CREATE TABLE recovery_codes (
  id TEXT NOT NULL PRIMARY KEY,
  user_id TEXT NOT NULL REFERENCES users (id),
  hash TEXT NOT NULL UNIQUE,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  used_at TEXT CHECK (used_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX recovery_codes_user_id ON recovery_codes (user_id);

CREATE TABLE sessions (
  sid TEXT NOT NULL PRIMARY KEY,
  user_id TEXT REFERENCES users (id),
  data TEXT NOT NULL,
  expires TEXT NOT NULL CHECK (expires GLOB '????-??-?? ??:??:??.??? +00:00'),
  absolute_expires_at TEXT NOT NULL CHECK (absolute_expires_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  last_seen_at TEXT NOT NULL CHECK (last_seen_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  address TEXT,
  agent TEXT NOT NULL DEFAULT ''
) STRICT;
CREATE INDEX sessions_user_id ON sessions (user_id) WHERE user_id IS NOT NULL;
CREATE INDEX sessions_expires ON sessions (expires);

CREATE TABLE consents (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT REFERENCES orders (id),
  user_id TEXT REFERENCES users (id),
  kind TEXT NOT NULL CHECK (kind IN ('policies', 'allergy-data', 'show-photos')),
  policy_version_id TEXT REFERENCES policy_versions (id),
  given INTEGER NOT NULL CHECK (given IN (0, 1)),
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00'),
  withdrawn_at TEXT CHECK (withdrawn_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK (order_id IS NOT NULL OR user_id IS NOT NULL)
) STRICT;
CREATE INDEX consents_order_id ON consents (order_id) WHERE order_id IS NOT NULL;
CREATE INDEX consents_user_id ON consents (user_id) WHERE user_id IS NOT NULL;
CREATE INDEX consents_policy_version_id ON consents (policy_version_id) WHERE policy_version_id IS NOT NULL;

CREATE TABLE idempotency_keys (
  scope TEXT NOT NULL,
  key TEXT NOT NULL,
  request_hash TEXT NOT NULL,
  status INTEGER NOT NULL,
  response TEXT NOT NULL,
  order_id TEXT REFERENCES orders (id),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  expires_at TEXT NOT NULL CHECK (expires_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  PRIMARY KEY (scope, key)
) STRICT, WITHOUT ROWID;
CREATE INDEX idempotency_keys_order_id ON idempotency_keys (order_id) WHERE order_id IS NOT NULL;
CREATE INDEX idempotency_keys_expires_at ON idempotency_keys (expires_at);

CREATE TABLE sign_in_failures (
  id TEXT NOT NULL PRIMARY KEY,
  account TEXT NOT NULL,
  address TEXT NOT NULL,
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX sign_in_failures_account ON sign_in_failures (account);
CREATE INDEX sign_in_failures_address ON sign_in_failures (address);

CREATE TABLE saved_views (
  id TEXT NOT NULL PRIMARY KEY,
  user_id TEXT NOT NULL REFERENCES users (id),
  page TEXT NOT NULL CHECK (page IN ('orders', 'calendar')),
  name TEXT NOT NULL,
  query TEXT NOT NULL CHECK (json_valid(query)),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (user_id, page, name)
) STRICT;
CREATE INDEX saved_views_user_id ON saved_views (user_id);
`,
};
