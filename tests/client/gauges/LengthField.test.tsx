import { fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { describe, expect, it } from "vitest";
import { LengthField } from "../../../client/features/gauges/LengthField";

function Written({ error }: { error?: string }) {
  const [text, setText] = useState("");
  return <LengthField name="bore" label="Bore" text={text} unit="mm" onText={setText} error={error} />;
}
const write = (text: string) => fireEvent.change(screen.getByLabelText("Bore"), { target: { value: text } });

describe("LengthField", () => {
  it("says what was understood where that is more than what was written", () => {
    render(<Written />);
    write("1-47/64");
    expect(screen.getByLabelText("Bore")).toHaveAccessibleDescription(/1-47\/64 in = 44\.05 mm/);
    write("44.1");
    expect(screen.getByLabelText("Bore")).not.toHaveAccessibleDescription();
  });

  it("says what cannot be read before what the sum finds wrong", () => {
    render(<Written error="A bore is smaller than its wheel." />);
    expect(screen.getByLabelText("Bore")).toHaveAccessibleDescription("A bore is smaller than its wheel.");
    write("4 furlongs");
    expect(screen.getByLabelText("Bore")).toBeInvalid();
    expect(screen.getByLabelText("Bore")).toHaveAccessibleDescription(/is not a unit known here/);
  });
});
