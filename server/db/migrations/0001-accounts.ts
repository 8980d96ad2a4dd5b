import type { Migration } from "../Migration";

export const accounts: Migration = {
  name: "0001-accounts",
  up: `
    CREATE EXTENSION IF NOT EXISTS citext;
    CREATE EXTENSION IF NOT EXISTS pg_trgm;
    CREATE EXTENSION IF NOT EXISTS unaccent;

    CREATE TABLE users (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      email citext NOT NULL CONSTRAINT users_email_once UNIQUE,
      email_verified_at timestamptz,
      password_hash text NOT NULL CONSTRAINT users_password_is_argon2id CHECK (password_hash LIKE '$argon2id$%'),
      display_name text NOT NULL CONSTRAINT users_display_name_length CHECK (length(display_name) BETWEEN 1 AND 60),
      role text NOT NULL DEFAULT 'restorer'
        CONSTRAINT users_role_known CHECK (role IN ('restorer', 'workshop', 'administrator')),
      disabled_at timestamptz,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now()
    );

    CREATE TABLE user_tokens (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      user_id uuid NOT NULL REFERENCES users ON DELETE CASCADE,
      purpose text NOT NULL CONSTRAINT user_tokens_purpose_known CHECK (purpose IN ('verify-email', 'reset-password')),
      token_hash bytea NOT NULL CONSTRAINT user_tokens_hash_once UNIQUE,
      expires_at timestamptz NOT NULL,
      used_at timestamptz,
      created_at timestamptz NOT NULL DEFAULT now()
    );
    CREATE INDEX user_tokens_user ON user_tokens (user_id, purpose);

    CREATE TABLE sessions (
      sid text PRIMARY KEY,
      sess json NOT NULL,
      expire timestamptz NOT NULL
    );
    CREATE INDEX sessions_expire ON sessions (expire);
    CREATE INDEX sessions_user ON sessions ((sess #>> '{passport,user}'));

    CREATE TABLE rate_limits (
      key varchar(255) PRIMARY KEY,
      points integer NOT NULL DEFAULT 0,
      expire bigint
    );

    CREATE TABLE addresses (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      user_id uuid NOT NULL REFERENCES users ON DELETE CASCADE,
      name text NOT NULL,
      line1 text NOT NULL,
      line2 text NOT NULL DEFAULT '',
      postcode text NOT NULL,
      town text NOT NULL,
      region text NOT NULL DEFAULT '',
      country char(2) NOT NULL CONSTRAINT addresses_country_code CHECK (country ~ '^[A-Z]{2}$'),
      created_at timestamptz NOT NULL DEFAULT now(),
      CONSTRAINT addresses_once UNIQUE (user_id, name, line1, line2, postcode, town, region, country)
    );

    CREATE TABLE audit_log (
      id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
      at timestamptz NOT NULL DEFAULT now(),
      actor_id uuid REFERENCES users,
      action text NOT NULL,
      subject_type text NOT NULL,
      subject_id text NOT NULL,
      detail jsonb NOT NULL DEFAULT '{}'
    );
    CREATE INDEX audit_log_subject ON audit_log (subject_type, subject_id, id);
    CREATE INDEX audit_log_at ON audit_log (at);

    CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
    END $$;
    CREATE TRIGGER audit_log_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON audit_log
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
  `,
  down: `
    DROP TABLE audit_log, addresses, rate_limits, sessions, user_tokens, users;
    DROP FUNCTION refuse_change;
    DROP EXTENSION unaccent, pg_trgm, citext;
  `,
};
