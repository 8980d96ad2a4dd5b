import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { SpeedPage } from "../../../../client/features/gauges/speed/SpeedPage";
import { renderAt } from "../../support/renderAt";

const open = (query = "") => {
  renderAt(`/gauges/speed${query}`, { "/gauges/speed": <SpeedPage /> });
  return userEvent.setup();
};
const side = () => within(screen.getByRole("complementary"));
const drawing = () => screen.getByRole("img", { name: "The drive train, to scale" });
const address = () => new URLSearchParams(screen.getByLabelText("address").textContent.split("?")[1]);
async function write(user: ReturnType<typeof userEvent.setup>, label: string | RegExp, text: string) {
  const field = screen.getByLabelText(label);
  await user.clear(field);
  await user.click(field);
  if (text) await user.paste(text);
}

describe("the speed gauge", () => {
  it("shows a worked example of a rim drive before anything is said", () => {
    open();
    // 1500 rpm less 4 % of slip, times 6.10 / 260.
    expect(side().getByText("33.78")).toBeVisible();
    expect(side().getByText("1.4 % fast: about a quarter of a semitone sharp.")).toBeVisible();
    expect(side().getByText("+1.35 %, +23.3 cents against 33 1/3 rpm")).toBeVisible();
    expect(screen.getByLabelText("Motor step, diameter")).toHaveValue("6.10");
  });

  it("says on the drawing what sets the speed, by how much, and what cancels", () => {
    open();
    const words = drawing().textContent;
    expect(words).toContain("0.01 mm here is 0.16 %");
    expect(words).toContain("0.01 mm here is 0.0038 %");
    expect(words).toContain("cancels: its size does");
    expect(drawing()).toHaveAccessibleDescription(/Idler cancels: its size does not change the speed/);
  });

  it("follows what is written, in any length format, and keeps it in the address", async () => {
    const user = open();
    await write(user, "Motor step, diameter", "1/4 in");
    expect(side().getByText("35.17")).toBeVisible();
    await waitFor(() => expect(address().get("stepDiameter")).toBe("1/4 in"));
    expect(address().get("drive")).toBe("rim");
  });

  it("does not mind how large a plain idler is", async () => {
    const user = open();
    await write(user, /^Idler, diameter/, "55");
    expect(side().getByText("33.78")).toBeVisible();
    await write(user, /^Idler, diameter/, "");
    expect(side().getByText("33.78")).toBeVisible();
    expect(drawing().textContent).toContain("Idler, any size");
  });

  it("names each published limit with its source, how it is known, and whether it is kept", () => {
    open();
    const limits = side()
      .getAllByRole("listitem")
      .map((item) => item.textContent);
    expect(limits).toEqual([
      expect.stringMatching(/^Turntable −1\.0 to \+1\.5 %: kept.*DIN 45500 part 3.*second hand/),
      expect.stringMatching(/^Cutting a record ±0\.5 % \(for recording\): outside.*IEC 60098:2020.*print/),
      expect.stringMatching(/^Studio turntable ±0\.3 %: outside.*From memory/),
    ]);
  });

  it("tells the step for the target, the step for the other mains, and what the parts would do there as they are", () => {
    open();
    expect(side().getByText("ø 6.019")).toBeVisible();
    expect(side().getByText("ø 5.083")).toBeVisible();
    expect(side().getByText(/Left as it is, it would run at 40\.54 rpm\. 21\.6 % fast/)).toBeVisible();
    expect(side().getByText(/Unplug the machine.*licensed person/)).toBeVisible();
    expect(side().getByRole("link", { name: "Print a stroboscope disc" })).toHaveAttribute("href", "/gauges/sheets");
  });

  it("takes a measured motor speed in place of slip", async () => {
    const user = open();
    await user.selectOptions(screen.getByLabelText("Its speed is known by"), "rpm");
    await write(user, "Motor measured, rpm", "1420,8");
    // 1420.8 x 6.10 / 260 is just 33 1/3.
    expect(side().getByText("Just right.")).toBeVisible();
    await write(user, "Motor measured, rpm", "1600");
    expect(screen.getByText("With 4 poles at 50 Hz it turns at most 1500 rpm.")).toBeVisible();
  });

  it("says what is wrong beside its field, and greys the last good picture", async () => {
    const user = open();
    await write(user, "Motor step, diameter", "banana");
    await write(user, "Poles of the motor", "3");
    expect(screen.getByLabelText("Motor step, diameter")).toBeInvalid();
    expect(screen.getByText(/“banana” does not begin with a number/)).toBeVisible();
    expect(screen.getByText("A motor has an even number of poles, from 2 to 48.")).toBeVisible();
    expect(screen.getByText(/not of these sizes/)).toBeVisible();
    expect(screen.getByText("33.78").closest("[inert]")).not.toBeNull();
    await write(user, "Motor step, diameter", "6");
    await write(user, "Poles of the motor", "4");
    expect(screen.queryByText(/not of these sizes/)).toBeNull();
    expect(screen.getByText("33.23").closest("[inert]")).toBeNull();
  });

  it("keeps what was written when the drive changes, and takes the example for what is not known", async () => {
    const user = open("?drive=rim&poles=6&slipPercent=3&stepDiameter=9&rimDiameter=260&target=45");
    await user.click(screen.getByRole("radio", { name: /Stepped idler/ }));
    expect(screen.getByLabelText("Motor step, diameter")).toHaveValue("9");
    expect(screen.getByLabelText("Idler, large tread, diameter")).toHaveValue("60");
    expect(screen.getByLabelText("Poles of the motor")).toHaveValue("6");
    expect(screen.getByLabelText("Speed wanted")).toHaveValue("45");
    await user.click(screen.getByRole("radio", { name: /Capstan/ }));
    expect(screen.getByLabelText("Speed wanted")).toHaveValue("3 3/4");
  });

  it("counts the thickness of the belt, and says so on the drawing", async () => {
    const user = open("?drive=belt");
    // 375 x 13.5 / 151, and without the belt 375 x 12.5 / 150.
    expect(side().getByText("33.53")).toBeVisible();
    expect(drawing()).toHaveAccessibleDescription(/Belt thickness 1\.0 mm: 0\.01 mm here is 0\.067 %/);
    await write(user, "Belt thickness", "0");
    expect(side().getByText("31.25")).toBeVisible();
    expect(drawing()).not.toHaveAccessibleDescription(/Belt thickness/);
  });

  it("runs a tape through several stages, which can be added and taken away", async () => {
    const user = open("?drive=capstan");
    expect(side().getByText("96.27")).toBeVisible();
    expect(side().getByText(/^3\.7901 in\/s/)).toBeVisible();
    await user.click(screen.getByRole("button", { name: "Add a stage" }));
    const second = within(screen.getByRole("group", { name: "Stage 2" }));
    await user.clear(second.getByLabelText(/^Flywheel/));
    await user.type(second.getByLabelText(/^Flywheel/), "40");
    expect(side().getByText("48.13")).toBeVisible();
    await waitFor(() => expect(address().getAll("stage")).toEqual(["10;62;0.5", "20;40;"]));
    await user.click(screen.getByRole("button", { name: "Take stage 2 away" }));
    expect(side().getByText("96.27")).toBeVisible();
  });

  it("shows inches to who works in them, without changing a size", async () => {
    const user = open();
    await user.selectOptions(screen.getByLabelText("Sizes without a unit are in"), "in");
    expect(screen.getByLabelText("Motor step, diameter")).toHaveValue("6.10 mm");
    expect(side().getByText("33.78")).toBeVisible();
    expect(drawing().textContent).toContain("0.001 in here is 0.42 %");
    await waitFor(() => expect(address().get("unit")).toBe("in"));
  });

  it("falls back on the example for an address that makes no sense", () => {
    open("?drive=rocket&target=7%201%2F2&mains=70&stage=;;;;&stepDiameter=6.10");
    expect(screen.getByRole("radio", { name: /Rim drive/ })).toBeChecked();
    expect(screen.getByLabelText("Speed wanted")).toHaveValue("33 1/3");
    expect(side().getByText("33.78")).toBeVisible();
  });

  it("tells only the speed where none is wanted", () => {
    open("?drive=rim&target=");
    expect(side().getByText("33.78")).toBeVisible();
    expect(side().queryByText(/published limits/)).toBeNull();
    expect(side().queryByText(/would hit the target/)).toBeNull();
  });
});
