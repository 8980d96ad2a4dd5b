import type { RequestHandler } from "express";
import { z } from "zod";
import type { Endpoint } from "./endpoint";

const escaped = (text: string) =>
  text.replaceAll("&", "&amp;").replaceAll("<", "&lt;").replaceAll(">", "&gt;").replaceAll('"', "&quot;");

const schemaBlock = (name: string, schema: z.ZodType | undefined, io: "input" | "output") =>
  schema
    ? `<details><summary>${name}</summary><pre>${escaped(JSON.stringify(z.toJSONSchema(schema, { io, unrepresentable: "any" }), null, 2))}</pre></details>`
    : "";

const section = (endpoint: Endpoint) => `<section>
<h3><code>${endpoint.method.toUpperCase()} /api/v1${escaped(endpoint.path)}</code></h3>
<p>${escaped(endpoint.summary)} ${endpoint.access === "anyone" ? "No sign-in." : endpoint.access === "signed-in" ? "Signed in." : `For: ${endpoint.access.join(", ")}.`}</p>
${schemaBlock("Address", endpoint.params, "input")}${schemaBlock("Query", endpoint.query, "input")}${schemaBlock("Body", endpoint.body, "input")}${schemaBlock("Answer", endpoint.answer, "output")}${endpoint.file ? `<p>Answers with a file: ${escaped(endpoint.file)}.</p>` : ""}
</section>`;

/** The interface as a page to read, from the same endpoints as the OpenAPI document. It needs no script and no style. */
export function readableInterface(endpoints: readonly Endpoint[]): RequestHandler {
  const tags = [...new Set(endpoints.map(({ tag }) => tag))];
  const page = `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>HTTP interface - Idlewright</title></head><body><main><h1>HTTP interface</h1>
<p>Machine-readable: <a href="/api/v1/openapi.json">openapi.json</a> (OpenAPI 3.1). Lengths are millimetres, money is integer minor units, times are UTC.</p>
${tags
  .map(
    (tag) =>
      `<h2>${escaped(tag)}</h2>${endpoints
        .filter((endpoint) => endpoint.tag === tag)
        .map(section)
        .join("\n")}`,
  )
  .join("\n")}
</main></body></html>`;
  return (_req, res) => {
    res.type("html").send(page);
  };
}
