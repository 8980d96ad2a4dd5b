import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { inTransaction } from "#server/db/inTransaction";
import { balances } from "#server/ledger/balances";
import { bookTransaction, type Entry } from "#server/ledger/bookTransaction";
import { paidEntries } from "#server/ledger/orderEntries";
import { LedgerEntry } from "#server/models/LedgerEntry";
import { LedgerTransaction } from "#server/models/LedgerTransaction";
import { Order } from "#server/models/Order";
import { Parcel } from "#server/models/Parcel";
import { buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const at = new Date("2026-12-01T10:00:00Z");
const book = (cause: string, entries: readonly Entry[]) =>
  inTransaction((transaction) => bookTransaction({ cause, orderId: null, at, entries }, transaction));
const eur = (account: "provider-balance" | "commission" | "refunds", amountMinor: number): Entry => ({
  account,
  amountMinor,
  currency: "EUR",
});

describe("bookTransaction", () => {
  it("books entries that sum to zero, and leaves out nothing but nothing", async () => {
    await book("plain", [eur("provider-balance", 500), eur("commission", -500), eur("refunds", 0)]);
    const { id } = await LedgerTransaction.findOne({ where: { cause: "plain" }, rejectOnEmpty: true });
    const entries = await LedgerEntry.findAll({ where: { transactionId: id }, order: [["id", "ASC"]] });
    expect(entries.map(({ account, amountMinor }) => [account, amountMinor])).toEqual([
      ["provider-balance", 500],
      ["commission", -500],
    ]);
  });

  it.each([
    ["does not sum to zero", [eur("provider-balance", 500), eur("commission", -499)]],
    ["sums to zero over currencies only", [eur("provider-balance", 5), { ...eur("commission", -5), currency: "USD" }]],
    ["is empty", []],
    ["is of nothing", [eur("provider-balance", 0)]],
  ])("refuses what %s, before the database does", async (what, entries) => {
    await expect(book(what, entries)).rejects.toThrow(/ledger: .* does not balance/);
    expect(await LedgerTransaction.count({ where: { cause: what } })).toBe(0);
  });

  it("books a cause once", async () => {
    const entries = [eur("provider-balance", 100), eur("refunds", -100)];
    expect(await book("once", entries)).toBe(true);
    expect(await book("once", entries)).toBe(false);
    expect(await LedgerTransaction.count({ where: { cause: "once" } })).toBe(1);
  });

  it("derives balances from the entries", async () => {
    const { id: workshopId } = await buildWorkshop();
    const held: Entry = { account: "workshop-held", workshopId, amountMinor: -900, currency: "EUR" };
    await book("held", [eur("provider-balance", 1000), held, eur("commission", -100)]);
    const all = await balances();
    expect(all.find((balance) => balance.workshopId === workshopId)?.amountMinor).toBe(-900);
    expect(all.reduce((sum, { amountMinor }) => sum + amountMinor, 0)).toBe(0);
  });
});

describe("the entries of a paid order", () => {
  it("give each workshop its parcel less commission, and us the commission", () => {
    const order = Order.build({ totalMinor: 6299, currency: "EUR" } as Order);
    const parcels = [
      Parcel.build({ workshopId: "a", totalMinor: 4700, commissionMinor: 320 } as Parcel),
      Parcel.build({ workshopId: "b", totalMinor: 1599, commissionMinor: 0 } as Parcel),
    ];
    expect(paidEntries(order, parcels).map(({ account, amountMinor }) => [account, amountMinor])).toEqual([
      ["provider-balance", 6299],
      ["workshop-held", -4380],
      ["workshop-held", -1599],
      ["commission", -320],
    ]);
  });
});

describe("the database", () => {
  const sql = (text: string) => site.services.pool.query(text);
  const unbalanced = (amounts: number[]) => `
    WITH t AS (INSERT INTO ledger_transactions (cause, at) VALUES ('raw ${amounts}', now()) RETURNING id)
    INSERT INTO ledger_entries (transaction_id, account, amount_minor, currency)
    SELECT id, 'commission', unnest(ARRAY[${amounts}]), 'EUR' FROM t`;

  it("refuses a transaction that does not balance, whoever writes it", async () => {
    await expect(sql(unbalanced([5, -4]))).rejects.toThrow(/does not balance/);
    await expect(sql("INSERT INTO ledger_transactions (cause, at) VALUES ('bare', now())")).rejects.toThrow(
      /does not balance/,
    );
    await sql(unbalanced([5, -5]));
  });

  it.each([
    ["an entry changed", "UPDATE ledger_entries SET amount_minor = 1"],
    ["an entry taken away", "DELETE FROM ledger_entries"],
    ["entries emptied", "TRUNCATE ledger_entries CASCADE"],
    ["a transaction changed", "UPDATE ledger_transactions SET cause = 'x'"],
    ["a transaction taken away", "DELETE FROM ledger_transactions"],
    ["the audit log changed", "UPDATE audit_log SET action = 'x'"],
  ])("refuses to have %s", async (_what, text) => {
    await expect(sql(text)).rejects.toThrow(/append-only/);
  });

  it("refuses an entry added later to a transaction that balances", async () => {
    await expect(
      sql(`INSERT INTO ledger_entries (transaction_id, account, amount_minor, currency)
           SELECT id, 'commission', 1, 'EUR' FROM ledger_transactions LIMIT 1`),
    ).rejects.toThrow(/does not balance/);
  });
});
