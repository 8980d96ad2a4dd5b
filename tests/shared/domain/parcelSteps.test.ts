import { describe, expect, it } from "vitest";
import { openParcelStates, parcelMayBecome, parcelStates } from "#shared/domain/parcelState";
import { nextStep, parcelSteps, stateAfter } from "#shared/domain/parcelSteps";

describe("the steps of a parcel", () => {
  it("only ever lead along its states", () => {
    const led = parcelStates.flatMap((state) => {
      const step = nextStep(state);
      return step ? [true, false].map((core) => [state, stateAfter(step, core)] as const) : [];
    });
    expect(led).toHaveLength(2 * parcelSteps.length);
    expect(led.filter(([from, to]) => !parcelMayBecome(from, to))).toEqual([]);
  });

  it.each([
    [false, ["to-accept", "in-work", "ready", "dispatched"]],
    [true, ["to-accept", "core-awaited", "core-received", "in-work", "ready", "dispatched"]],
  ])("lead to the post, with a core: %s", (needsCore, way) => {
    const walked = [parcelStates[0] as (typeof parcelStates)[number]];
    for (let step = nextStep("to-accept"); step; step = nextStep(walked.at(-1) ?? "closed")) {
      walked.push(stateAfter(step, needsCore));
    }
    expect(walked).toEqual(way);
  });

  it("are taken with open parcels alone", () => {
    expect(parcelStates.filter((state) => nextStep(state) !== null)).toEqual(
      openParcelStates.filter((state) => state !== "core-refused"),
    );
  });
});
