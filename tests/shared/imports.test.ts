import { readdirSync, readFileSync } from "node:fs";
import { dirname, join, relative, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { expect, it } from "vitest";

const root = resolve(dirname(fileURLToPath(import.meta.url)), "../..");

/** From a folder to the folders that it may import from; the longest matching name counts. */
const arrows: Record<string, readonly string[]> = {
  shared: ["shared"],
  "shared/domain": ["shared/domain"],
  "shared/drawing": ["shared/drawing", "shared/domain"],
  "client/lib": ["client/lib", "client/ui", "shared"],
  "client/ui": ["client/ui", "client/lib", "shared"],
  "client/features": ["client/features", "client/ui", "client/lib", "shared"],
  "client/app": ["client", "shared"],
  client: ["client", "shared"],
  "server/policies": ["server/policies", "server/errors", "shared"],
  "server/models": ["server/models", "shared"],
  "server/presenters": ["server", "shared"],
  server: ["server", "shared"],
  fakes: ["fakes"],
};

const files = (folder: string): string[] =>
  readdirSync(join(root, folder), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && /\.tsx?$/.test(entry.name))
    .map((entry) => relative(root, join(entry.parentPath, entry.name)));

const importsOf = (file: string): string[] =>
  [...readFileSync(join(root, file), "utf8").matchAll(/(?:from|import)\s*\(?\s*"([#.][^"]+)"/g)].map(([, to = ""]) =>
    to.startsWith("#") ? to.slice(1) : relative(root, resolve(root, dirname(file), to)),
  );

const ruleOf = (file: string) =>
  Object.keys(arrows)
    .filter((folder) => file.startsWith(`${folder}/`))
    .sort((a, b) => b.length - a.length)[0];

const wrongArrows = (from: readonly string[]) =>
  from.flatMap((file) => {
    const allowed = arrows[ruleOf(file) ?? ""] ?? [];
    return importsOf(file)
      .filter((to) => !allowed.some((folder) => to.startsWith(`${folder}/`)))
      .map((to) => `${file} -> ${to}`);
  });

const sources = ["shared", "client", "server", "fakes"].flatMap(files);

it("draws every import arrow the allowed way", () => {
  expect(sources.length).toBeGreaterThan(100);
  expect(wrongArrows(sources)).toEqual([]);
});

it("keeps features from each other's inside", () => {
  const featureOf = (path: string) => /^client\/features\/([^/]+)\//.exec(path)?.[1];
  // What a person signs in with is every feature's affair.
  const open = new Set(["account"]);
  const crossings = sources.flatMap((file) =>
    importsOf(file)
      .filter(
        (to) => featureOf(file) && featureOf(to) && featureOf(to) !== featureOf(file) && !open.has(featureOf(to) ?? ""),
      )
      .map((to) => `${file} -> ${to}`),
  );
  expect(crossings).toEqual([]);
});

it("keeps commands from routes, and routes from each other", () => {
  const crossings = sources.flatMap((file) =>
    importsOf(file)
      .filter(
        (to) =>
          (/^server\/(commands|policies|models|presenters)\//.test(file) && to.startsWith("server/routes/")) ||
          (/^server\/routes\/(?!endpointsOf)/.test(file) && to.startsWith("server/routes/")),
      )
      .map((to) => `${file} -> ${to}`),
  );
  expect(crossings).toEqual([]);
});

it("has no import that goes in a circle", () => {
  const graph = new Map(sources.map((file) => [file, importsOf(file)]));
  const fileOf = (to: string) => [`${to}.ts`, `${to}.tsx`].find((name) => graph.has(name));
  const typeOnly = (file: string, to: string) => {
    const text = readFileSync(join(root, file), "utf8");
    const lines = text.match(/import[^;]*?from\s*"[^"]+"/gs) ?? [];
    return lines.some((line) => line.startsWith("import type") && line.includes(to.split("/").at(-1) ?? to));
  };
  const done = new Set<string>();
  const circles: string[] = [];
  const visit = (file: string, trail: readonly string[]) => {
    if (trail.includes(file)) {
      circles.push([...trail.slice(trail.indexOf(file)), file].join(" -> "));
      return;
    }
    if (done.has(file)) return;
    done.add(file);
    for (const to of graph.get(file) ?? []) {
      const next = fileOf(to);
      if (next && !typeOnly(file, to)) visit(next, [...trail, file]);
    }
  };
  for (const file of sources) visit(file, []);
  expect(circles).toEqual([]);
});
