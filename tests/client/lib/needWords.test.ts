import { expect, it } from "vitest";
import { needWords } from "../../../client/lib/needWords";
import { buildSearchAnswer } from "../support/buildSearchAnswer";

it("puts a need in a few words, with the sizes that were written as they were understood", () => {
  const { need } = buildSearchAnswer();
  const size = need.dimensions[0]!;
  const words = (...echoes: string[]) =>
    needWords({ ...need, dimensions: echoes.map((echo) => ({ ...size, text: echo, echo })) });
  expect(words("44.1 mm")).toBe("idler wheel, outside diameter 44.1 mm");
  expect(words("3 readings, mean 44.10 mm", "4 mm")).toBe(
    "idler wheel, outside diameter (3 readings, mean 44.10 mm), outside diameter 4 mm",
  );
  expect(words("worked out as 44 ± 0.5 mm")).toBe("idler wheel, outside diameter worked out as 44 ± 0.5 mm");
});
