import type { Migration } from "../Migration";

export const ledger: Migration = {
  name: "0006-ledger",
  up: `
    CREATE TABLE ledger_transactions (
      id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
      -- What it books, said once: the same cause cannot be booked twice.
      cause text NOT NULL CONSTRAINT ledger_transactions_cause_once UNIQUE,
      order_id uuid REFERENCES orders,
      at timestamptz NOT NULL
    );
    CREATE INDEX ledger_transactions_order ON ledger_transactions (order_id);

    CREATE TABLE ledger_entries (
      id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
      transaction_id bigint NOT NULL REFERENCES ledger_transactions,
      account text NOT NULL CONSTRAINT ledger_entries_account_known
        CHECK (account IN ('provider-balance', 'workshop-held', 'commission', 'refunds')),
      workshop_id uuid REFERENCES workshops,
      -- Debit positive, credit negative.
      amount_minor bigint NOT NULL CONSTRAINT ledger_entries_amount_not_zero CHECK (amount_minor <> 0),
      currency char(3) NOT NULL CONSTRAINT ledger_entries_currency_code CHECK (currency ~ '^[A-Z]{3}$'),
      CONSTRAINT ledger_entries_workshop_where_held CHECK ((account = 'workshop-held') = (workshop_id IS NOT NULL))
    );
    CREATE INDEX ledger_entries_transaction ON ledger_entries (transaction_id);
    CREATE INDEX ledger_entries_account ON ledger_entries (account, workshop_id, currency);

    CREATE FUNCTION require_balance() RETURNS trigger LANGUAGE plpgsql AS $$
    DECLARE
      wanted bigint := CASE TG_TABLE_NAME WHEN 'ledger_entries' THEN (to_jsonb(NEW) ->> 'transaction_id')::bigint
        ELSE (to_jsonb(NEW) ->> 'id')::bigint END;
    BEGIN
      IF NOT EXISTS (SELECT 1 FROM ledger_entries WHERE transaction_id = wanted)
        OR EXISTS (SELECT 1 FROM ledger_entries WHERE transaction_id = wanted
                   GROUP BY currency HAVING sum(amount_minor) <> 0) THEN
        RAISE EXCEPTION 'ledger transaction % does not balance', wanted
          USING ERRCODE = 'check_violation', CONSTRAINT = 'ledger_transactions_balance';
      END IF;
      RETURN NULL;
    END $$;
    CREATE CONSTRAINT TRIGGER ledger_entries_balance AFTER INSERT ON ledger_entries
      DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION require_balance();
    CREATE CONSTRAINT TRIGGER ledger_transactions_balance AFTER INSERT ON ledger_transactions
      DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION require_balance();

    CREATE TRIGGER ledger_entries_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON ledger_entries
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
    CREATE TRIGGER ledger_transactions_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON ledger_transactions
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
  `,
  down: `
    DROP TABLE ledger_entries, ledger_transactions;
    DROP FUNCTION require_balance;
  `,
};
