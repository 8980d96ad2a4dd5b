import { createServer } from "node:http";
import { resolve } from "node:path";
import { createApp } from "./app";
import { readConfig } from "./config";
import { closeServices, createServices } from "./createServices";
import { startWorker } from "./jobs/startWorker";

const graceMs = 25_000;

const config = readConfig(process.env);
const services = createServices(config);
const { logger } = services;
const worker = await startWorker(services);
const server = createServer(createApp(services, { clientDir: resolve(process.env.CLIENT_DIR ?? "dist/client") }));

server.listen(config.port, config.host, () => {
  logger.info({ port: config.port, mode: config.mode }, "listening");
  process.send?.({ ready: true });
});

let stopping = false;
/** Stops taking requests, lets running ones and jobs end, then lets go of the database. */
async function stop(signal: string) {
  if (stopping) return;
  stopping = true;
  logger.info({ signal }, "stopping");
  setTimeout(() => process.exit(1), graceMs).unref();
  await new Promise<void>((done) => {
    server.close(() => done());
    server.closeIdleConnections();
  });
  await worker.stop();
  await closeServices(services);
  process.exit(0);
}
for (const signal of ["SIGTERM", "SIGINT"] as const) process.on(signal, () => void stop(signal));
process.on("unhandledRejection", (error) => {
  logger.fatal({ err: error }, "a failure that nothing caught");
  process.exit(1);
});
