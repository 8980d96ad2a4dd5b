import type { z } from "zod";
import { readBalance } from "./balance";
import { createSession } from "./createSession";
import { findEvent, listEvents } from "./events";
import { expandPaths } from "./expandPaths";
import { matches, newestFirst, page, within } from "./lists";
import { missing } from "./ProviderError";
import * as accepts from "./parameters";
import { cancelPaymentIntent, createPaymentIntent, findPaymentIntent } from "./paymentIntents";
import { readParameters } from "./readParameters";
import { createRefund, findRefund, updateRefund } from "./refunds";
import { expireSession, findSession } from "./sessions";
import { createTransfer, createTransferReversal, findTransfer, reversalsOf } from "./transfers";
import type { World } from "./World";

type Path = Readonly<Record<string, string>>;

export interface Endpoint {
  readonly method: "GET" | "POST";
  /** Express pattern; the names in it are those of the description. */
  readonly path: string;
  /** Checks the parameters (throws a 400) and gives back the work, which has no other input and does not wait. */
  prepare(world: World, path: Path, raw: unknown): () => unknown;
}

type Expandable = z.ZodType<{ expand?: string[] | undefined }>;
type Run<Schema extends Expandable> = (world: World, params: z.output<Schema>, path: Path) => unknown;

const endpoint =
  (method: "GET" | "POST") =>
  <Schema extends Expandable>(path: string, schema: Schema, run: Run<Schema>): Endpoint => ({
    method,
    path,
    prepare(world, pathParams, raw) {
      const params = readParameters(schema, raw);
      return () => expandPaths(world, run(world, params, pathParams), params.expand);
    },
  });
const get = endpoint("GET");
const post = endpoint("POST");

function findIn<Item>(items: ReadonlyMap<string, Item>, kind: string, id: string, param: string): Item {
  const found = items.get(id);
  if (found === undefined) throw missing(kind, id, param);
  return found;
}

/** Everything that the stand-in answers. `refundStatus` is what a new refund starts as. */
export const endpoints = (refundStatus: () => "succeeded" | "pending"): readonly Endpoint[] => [
  post("/v1/checkout/sessions", accepts.CreateSession, createSession),
  get("/v1/checkout/sessions", accepts.ListSessions, ({ store }, params) => {
    const found = newestFirst(store.sessions).filter(
      (session) =>
        matches(params.payment_intent, session.payment_intent) &&
        matches(params.customer_details?.email, session.customer_details?.email),
    );
    return page(found, params, "/v1/checkout/sessions");
  }),
  get("/v1/checkout/sessions/:session", accepts.RetrieveOne, (world, _, { session }) => findSession(world, session!)),
  get("/v1/checkout/sessions/:session/line_items", accepts.ListPlain, (world, params, { session }) => {
    const { id } = findSession(world, session!);
    return page(world.store.lineItems.get(id) ?? [], params, `/v1/checkout/sessions/${id}/line_items`);
  }),
  post("/v1/checkout/sessions/:session/expire", accepts.RetrieveOne, (world, _, { session }) =>
    expireSession(world, session!),
  ),

  post("/v1/payment_intents", accepts.CreatePaymentIntent, createPaymentIntent),
  get("/v1/payment_intents", accepts.ListPaymentIntents, ({ store }, params) => {
    const found = newestFirst(store.paymentIntents).filter((intent) => within(intent.created, params.created));
    return page(found, params, "/v1/payment_intents");
  }),
  get("/v1/payment_intents/:intent", accepts.RetrievePaymentIntent, (world, _, { intent }) =>
    findPaymentIntent(world, intent!),
  ),
  post("/v1/payment_intents/:intent/cancel", accepts.CancelPaymentIntent, (world, params, { intent }) =>
    cancelPaymentIntent(world, intent!, params.cancellation_reason),
  ),

  get("/v1/charges", accepts.ListCharges, ({ store }, params) => {
    const found = newestFirst(store.charges).filter(
      (charge) =>
        within(charge.created, params.created) &&
        matches(params.payment_intent, charge.payment_intent) &&
        matches(params.transfer_group, charge.transfer_group),
    );
    return page(found, params, "/v1/charges");
  }),
  get("/v1/charges/:charge", accepts.RetrieveOne, ({ store }, _, { charge }) =>
    findIn(store.charges, "charge", charge!, "charge"),
  ),

  post("/v1/refunds", accepts.CreateRefund, (world, params) => createRefund(world, params, refundStatus())),
  get("/v1/refunds", accepts.ListRefunds, ({ store }, params) => {
    const found = newestFirst(store.refunds).filter(
      (refund) =>
        within(refund.created, params.created) &&
        matches(params.charge, refund.charge) &&
        matches(params.payment_intent, refund.payment_intent),
    );
    return page(found, params, "/v1/refunds");
  }),
  get("/v1/refunds/:refund", accepts.RetrieveOne, (world, _, { refund }) => findRefund(world, refund!)),
  post("/v1/refunds/:refund", accepts.UpdateRefund, (world, params, { refund }) =>
    updateRefund(world, refund!, params.metadata),
  ),

  get("/v1/events", accepts.ListEvents, listEvents),
  get("/v1/events/:id", accepts.RetrieveOne, (world, _, { id }) => findEvent(world, id!)),

  get("/v1/balance", accepts.RetrieveOne, readBalance),
  get("/v1/balance_transactions", accepts.ListBalanceTransactions, ({ store }, params) => {
    const found = newestFirst(store.balanceTransactions).filter(
      (transaction) =>
        within(transaction.created, params.created) &&
        matches(params.currency, transaction.currency) &&
        matches(params.source, transaction.source) &&
        matches(params.type, transaction.type),
    );
    return page(found, params, "/v1/balance_transactions");
  }),
  get("/v1/balance_transactions/:id", accepts.RetrieveOne, ({ store }, _, { id }) =>
    findIn(store.balanceTransactions, "balance transaction", id!, "id"),
  ),

  post("/v1/transfers", accepts.CreateTransfer, createTransfer),
  get("/v1/transfers", accepts.ListTransfers, ({ store }, params) => {
    const found = newestFirst(store.transfers).filter(
      (transfer) =>
        within(transfer.created, params.created) &&
        matches(params.destination, transfer.destination) &&
        matches(params.transfer_group, transfer.transfer_group),
    );
    return page(found, params, "/v1/transfers");
  }),
  get("/v1/transfers/:transfer", accepts.RetrieveOne, (world, _, { transfer }) => findTransfer(world, transfer!)),
  post("/v1/transfers/:id/reversals", accepts.CreateTransferReversal, (world, params, { id }) =>
    createTransferReversal(world, id!, params),
  ),
  get("/v1/transfers/:id/reversals", accepts.ListPlain, (world, params, { id }) =>
    page(reversalsOf(world, findTransfer(world, id!).id), params, `/v1/transfers/${id}/reversals`),
  ),
];
