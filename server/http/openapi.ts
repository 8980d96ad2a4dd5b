import { z } from "zod";
import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from "zod-openapi";
import { problems } from "#shared/problems";
import type { Endpoint } from "./endpoint";

const ProblemDocument = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    detail: z.string(),
    errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
  })
  .meta({ id: "Problem", description: "RFC 9457 problem details" });

const problemAnswer = (description: string) => ({
  description,
  content: { "application/problem+json": { schema: ProblemDocument } },
});

/** What a call answers when all is well. */
function doneAnswer({ answer, file }: Endpoint) {
  if (file)
    return { description: "The file", content: { [file]: { schema: { type: "string", format: "binary" } } } } as const;
  return answer
    ? { description: "Done", content: { "application/json": { schema: answer } } }
    : { description: "Done" };
}

function operation(endpoint: Endpoint): ZodOpenApiOperationObject {
  const { params, query, body, answer, file, access, summary, tag, pure, method } = endpoint;
  const done = answer || file ? String(endpoint.status ?? 200) : "204";
  return {
    summary,
    tags: [tag],
    security: access === "anyone" ? [] : [{ session: [] }],
    ...(params || query
      ? {
          requestParams: {
            ...(params ? { path: params as z.ZodObject } : {}),
            ...(query ? { query: query as z.ZodObject } : {}),
          },
        }
      : {}),
    ...(method !== "get" && !pure
      ? { parameters: [{ name: "X-CSRF-Token", in: "header" as const, required: true, schema: { type: "string" } }] }
      : {}),
    ...(body ? { requestBody: { required: true, content: { "application/json": { schema: body } } } } : {}),
    responses: {
      [done]: doneAnswer(endpoint),
      ...(access === "anyone" ? {} : { 401: problemAnswer("Not signed in") }),
      ...(params ? { 404: problemAnswer("Not there, or not yours") } : {}),
      ...(query || body ? { 422: problemAnswer("Not valid: `errors` names the fields") } : {}),
      429: problemAnswer("Too often: wait as `Retry-After` says"),
    },
  };
}

/** The interface as OpenAPI 3.1, made from the endpoints that serve it. */
export function describeInterface(endpoints: readonly Endpoint[]): object {
  const paths: ZodOpenApiPathsObject = {};
  for (const endpoint of endpoints) {
    const path = `/api/v1${endpoint.path.replaceAll(/:(\w+)/g, "{$1}")}`;
    paths[path] = { ...paths[path], [endpoint.method]: operation(endpoint) };
  }
  return createDocument({
    openapi: "3.1.0",
    info: {
      title: "Idlewright",
      version: "1",
      description: `Lengths are numbers in millimetres and end in Mm; money is an integer in minor units beside its currency; times are RFC 3339 UTC. Problems: ${Object.keys(problems).join(", ")}.`,
    },
    paths,
    components: { securitySchemes: { session: { type: "apiKey", in: "cookie", name: "idlewright" } } },
  });
}
