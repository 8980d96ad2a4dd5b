import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { readSpeeds } from "#shared/domain/readSpeeds";

describe("readSpeeds", () => {
  it.each([
    ["16 2/3,33 1/3,45,78", [50 / 3, 100 / 3, 45, 78]],
    [" 45 , 76.59 ", [45, 76.59]],
    ["45,45.0,90/2", [45]],
  ])("reads %j", (text, speeds) => {
    expect(readSpeeds(text)).toEqual(speeds);
  });

  it.each(["", ",", "45,", "45;78", "fast", "-45", "0", "45/0", "1e9", "NaN", "9".repeat(400), "1,2,3,4,5,6,7"])(
    "refuses %j",
    (text) => {
      expect(() => readSpeeds(text)).toThrow(DomainError);
    },
  );
});
