import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { gzipSync } from "node:zlib";
import { build } from "esbuild";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { keepBuild } from "../../server/launch/build.mjs";
import { root } from "../../server/launch/paths.mjs";

/** One file of a build, as Vite's manifest tells of it. */
type Chunk = { file: string; imports?: string[]; dynamicImports?: string[] };

const home = "client/features/search/HomePage.tsx";
const kB = 1000;
const gzipped = (content: string | Uint8Array) => gzipSync(content).byteLength;

/** Keys of a chunk and of all that it loads at once. */
function withImports(manifest: Record<string, Chunk>, key: string, found = new Set<string>()): Set<string> {
  if (found.has(key)) return found;
  found.add(key);
  for (const next of manifest[key]?.imports ?? []) withImports(manifest, next, found);
  return found;
}

describe("what a browser has to fetch", { timeout: 120_000 }, () => {
  let kept: Awaited<ReturnType<typeof keepBuild>> | undefined;
  let manifest: Record<string, Chunk>;
  let first: Set<string>;
  const read = (file: string) => readFileSync(join(kept?.folder ?? "", "client", file));
  const sizeOf = (keys: Iterable<string>) =>
    [...keys].reduce((total, key) => total + gzipped(read(manifest[key]?.file ?? "")), 0);

  beforeAll(async () => {
    kept = await keepBuild();
    manifest = JSON.parse(read(".vite/manifest.json").toString());
    first = withImports(manifest, "index.html");
  }, 120_000);
  afterAll(() => kept?.release());

  it("loads at most 110 kB of script, gzip, for the home page", () => {
    const html = read("index.html").toString();
    const scripts = [...html.matchAll(/<script\b[^>]*\bsrc="\/([^"]+)"/g)].map(([, file]) => file ?? "");
    expect(scripts).toContain(manifest["index.html"]?.file);
    const beside = scripts.filter((file) => file !== manifest["index.html"]?.file);

    expect(manifest["index.html"]?.dynamicImports).toContain(home);
    const keys = new Set([...first, ...withImports(manifest, home)]);
    const size = sizeOf(keys) + beside.reduce((total, file) => total + gzipped(read(file)), 0);
    expect(size, `the first route has ${size} bytes`).toBeLessThanOrEqual(110 * kB);
  });

  it("fetches no piece of more than 40 kB for what comes later", () => {
    const later = Object.keys(manifest).filter((key) => manifest[key]?.file.endsWith(".js") && !first.has(key));
    expect(later.length).toBeGreaterThan(5);
    const heavy = later.map((key) => ({ key, size: sizeOf([key]) })).filter(({ size }) => size > 40 * kB);
    expect(heavy).toEqual([]);
  });

  it("keeps the whole of shared/domain under 25 kB, with the packages that it uses", async () => {
    const files = readdirSync(join(root, "shared/domain"), { recursive: true, encoding: "utf8" });
    const contents = files
      .filter((file) => file.endsWith(".ts"))
      .map((file) => `export * from "./${file}";`)
      .join("\n");
    const { outputFiles } = await build({
      stdin: { contents, resolveDir: join(root, "shared/domain") },
      bundle: true,
      minify: true,
      format: "esm",
      target: "es2022",
      write: false,
      logLevel: "silent",
    });
    const size = gzipped(outputFiles[0]?.contents ?? "");
    expect(size).toBeGreaterThan(kB);
    expect(size, `shared/domain has ${size} bytes`).toBeLessThan(25 * kB);
  });
});
