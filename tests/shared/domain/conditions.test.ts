import { describe, expect, it } from "vitest";
import { conditionFacts, conditionProblem, conditions, conditionsFor } from "#shared/domain/conditions";
import { partKinds } from "#shared/domain/partKinds";

describe("conditions", () => {
  it.each([
    ["idler-wheel", ["sound", "glazed", "hardened", "flat-spotted", "swollen", "melted", "missing"]],
    ["pinch-roller", ["sound", "glazed", "hardened", "flat-spotted", "swollen", "melted", "missing"]],
    ["flat-belt", ["sound", "glazed", "hardened", "swollen", "slack", "melted", "missing"]],
    ["drive-ring", ["sound", "glazed", "hardened", "flat-spotted", "swollen", "slack", "melted", "missing"]],
    ["motor-mount", ["sound", "hardened", "swollen", "melted", "missing"]],
    ["brake-pad", ["sound", "glazed", "hardened", "swollen", "melted", "missing"]],
    ["clutch-felt", ["sound", "glazed", "hardened", "swollen", "missing"]],
  ] as const)("%s can be %j", (kind, expected) => expect(conditionsFor(kind)).toEqual(expected));

  it("says in words why a condition is refused, and nothing where it makes sense", () => {
    expect(conditionProblem("idler-wheel", "slack")).toBe(
      "Idler wheels do not become slack. Choose one of: sound, glazed, hardened, flat-spotted, swollen, melted, missing.",
    );
    for (const kind of partKinds) {
      for (const condition of conditions) {
        expect(conditionProblem(kind, condition) === undefined).toBe(conditionsFor(kind).includes(condition));
      }
    }
  });

  it("leaves nothing to measure of melted and missing parts", () => {
    expect(conditions.filter((condition) => !conditionFacts[condition].hasReadings)).toEqual(["melted", "missing"]);
  });
});
