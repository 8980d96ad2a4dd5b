import express from "express";
import request from "supertest";
import { expect, it } from "vitest";
import { compressed } from "#server/http/compressed";

const app = express();
app.use(compressed());
app.use(
  "/api/v1",
  express.Router().get("/{*rest}", (_req, res) => void res.json({ words: "long enough ".repeat(500) })),
);

const encodingOf = async (path: string) =>
  (await request(app).get(path).set("Accept-Encoding", "br, gzip")).headers["content-encoding"];

it("makes long answers shorter, but never those that carry the secret of a session", async () => {
  expect(await encodingOf("/api/v1/search")).toBe("br");
  expect(await encodingOf("/api/v1/auth/session")).toBeUndefined();
});
