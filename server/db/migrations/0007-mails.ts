import type { Migration } from "../Migration";

export const mails: Migration = {
  name: "0007-mails",
  up: `
    CREATE TABLE mails (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      -- Event and recipient in one word: one mail an event, whatever is retried.
      cause text NOT NULL CONSTRAINT mails_cause_once UNIQUE,
      template text NOT NULL,
      recipient citext NOT NULL,
      payload jsonb NOT NULL,
      state text NOT NULL DEFAULT 'queued' CONSTRAINT mails_state_known CHECK (state IN ('queued', 'sent', 'failed')),
      last_error text,
      created_at timestamptz NOT NULL DEFAULT now(),
      sent_at timestamptz,
      CONSTRAINT mails_sent_have_time CHECK ((state = 'sent') = (sent_at IS NOT NULL))
    );
    CREATE INDEX mails_state ON mails (state, created_at);
  `,
  down: "DROP TABLE mails;",
};
