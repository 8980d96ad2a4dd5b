import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import express from "express";
import { apiRouter } from "./apiRouter";
import { controlRouter } from "./controlRouter";
import { createControl, type StripeFakeControl } from "./createControl";
import { payRouter } from "./payRouter";
import { catchUp } from "./sessions";
import { Troubles } from "./Troubles";
import { WebhookSender } from "./WebhookSender";
import { World } from "./World";

export interface StripeFakeOptions {
  /** 0 (a free one) unless given. Listens on 127.0.0.1 only. */
  readonly port?: number;
  /** Where events are posted; nowhere unless given. */
  readonly webhookUrl?: string;
  readonly webhookSecret: string;
  /** The only secret key that is let in. Live keys are refused. */
  readonly apiKey: string;
  /** Address under which buyers reach the hosted page; the server's own unless given. */
  readonly publicUrl?: string;
  /** Time for everything but webhook signatures. */
  readonly clock?: () => Date;
  /** Real time, which webhook signatures carry and their receiver checks. */
  readonly wallClock?: () => Date;
  /** Chance in [0, 1). */
  readonly random?: () => number;
  /** How often sessions expire by themselves, in ms; only when something looks unless given. */
  readonly tickMs?: number;
}

export interface StripeFake {
  /** `http://127.0.0.1:<port>` */
  readonly url: string;
  readonly port: number;
  readonly control: StripeFakeControl;
  /** Stops listening, sending and ticking; connections that hang are cut. */
  close(): Promise<void>;
}

function listen(server: Server, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, "127.0.0.1", () => resolve((server.address() as AddressInfo).port));
  });
}

/**
 * Starts the stand-in for the payment provider: its HTTP API under `/v1`, its hosted page under `/pay`, and the
 * controls under `/_control`. Rejects when the port is taken.
 */
export async function startStripeFake(options: StripeFakeOptions): Promise<StripeFake> {
  const systemClock = () => new Date();
  if (/^[rs]k_live_/.test(options.apiKey)) throw new Error("The payment stand-in refuses live keys.");

  const world = new World({ clock: options.clock ?? systemClock, random: options.random ?? Math.random });
  const sender = new WebhookSender({
    world,
    url: options.webhookUrl,
    secret: options.webhookSecret,
    wallClock: options.wallClock ?? systemClock,
  });
  const troubles = new Troubles();
  const refunds: { status: "succeeded" | "pending" } = { status: "succeeded" };
  const control = createControl({ world, sender, troubles, refunds });

  const app = express();
  app.disable("x-powered-by");
  app.disable("etag");
  app.set("query parser", "extended");
  app.use("/v1", apiRouter({ world, apiKey: options.apiKey, troubles, refundStatus: () => refunds.status }));
  app.use("/_control", controlRouter(control));
  app.use(payRouter(world));

  const server = createServer(app);
  const port = await listen(server, options.port ?? 0);
  const url = `http://127.0.0.1:${port}`;
  world.publicUrl = (options.publicUrl ?? url).replace(/\/+$/, "");
  const tick = options.tickMs === undefined ? undefined : setInterval(() => catchUp(world), options.tickMs).unref();

  return {
    url,
    port,
    control,
    close() {
      clearInterval(tick);
      sender.close();
      troubles.clear();
      return new Promise((resolve, reject) => {
        server.close((error) => (error ? reject(error) : resolve()));
        server.closeAllConnections();
      });
    },
  };
}
