import { fireEvent, screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { SheetsPage } from "../../../../client/features/gauges/sheets/SheetsPage";
import { renderAt } from "../../support/renderAt";

const renderSheets = (search = "") => renderAt(`/gauges/sheets${search}`, { "/gauges/sheets": <SheetsPage /> });
const rings = () =>
  within(screen.getByRole("table", { name: "What the rings really show" }))
    .getAllByRole("row")
    .slice(1)
    .map((row) => row.textContent);
const pdf = () => new URL(screen.getByRole("link", { name: "Open the PDF" }).getAttribute("href") ?? "", "http://here");
const write = (label: string | RegExp, value: string) =>
  fireEvent.change(screen.getByLabelText(label), { target: { value } });

describe("the sheets", () => {
  it("opens on a worked disc and says what each of its rings really shows, before it is printed", () => {
    renderSheets();
    expect(rings()).toEqual([
      "4545 rpm, exact400 bars, 3 pass at each flash",
      "16 2/316 2/3 rpm, exact360 bars",
      "33 1/333 1/3 rpm, exact180 bars",
      "4545.11 rpm, +0.25 %133 bars; at 45 rpm they creep 15 a minute back",
      "7877.92 rpm, −0.10 %77 bars; at 78 rpm they creep 6 a minute forward",
    ]);
    expect(pdf().pathname).toBe("/api/v1/gauges/sheets/strobe");
    expect(Object.fromEntries(pdf().searchParams)).toEqual({
      mainsHz: "50",
      speeds: "16 2/3,33 1/3,45,78",
      spindleMm: "7.2",
      paper: "a4",
    });
    expect(screen.getByText(/Measure the black bars with a calliper/)).toBeInTheDocument();
  });

  it("draws the disc with the bars that it tells of", () => {
    renderSheets("?mainsHz=60&speeds=33+1/3,80");
    const picture = screen.getByRole("img", { name: /^Stroboscope disc, as it will be printed: rings of 216 bars/ });
    const bars = [...picture.querySelectorAll("path")].map((path) => path.getAttribute("d")?.split("M").length ?? 0);
    expect(bars.map((pieces) => pieces - 1).filter((pieces) => pieces > 20)).toEqual([216, 90]);
  });

  it("follows the mains, the speeds and the paper, and keeps them in the address", async () => {
    renderSheets();
    await userEvent.selectOptions(screen.getByLabelText("Mains of the lamp"), "60 Hz");
    await userEvent.click(screen.getByRole("checkbox", { name: "16 2/3" }));
    await userEvent.selectOptions(screen.getByLabelText("Paper"), "US Letter");
    write(/Other speeds/, "80");
    write("Hole for the spindle", "1/4 in");
    expect(rings()?.map((row) => row?.slice(0, 8))).toEqual(["33 1/333", "4545 rpm", "7878.26 ", "8080 rpm"]);
    expect(Object.fromEntries(pdf().searchParams)).toMatchObject({ mainsHz: "60", paper: "letter", spindleMm: "6.35" });
    expect(pdf().searchParams.get("speeds")).toBe("33 1/3,45,78,80");
    await waitFor(() => expect(screen.getByLabelText("address")).toHaveTextContent(/mainsHz=60&speeds=33.*80/));
  });

  it("keeps the picture and says beside the field what cannot be drawn", async () => {
    renderSheets();
    write(/Other speeds/, "1");
    expect(screen.getByLabelText(/Other speeds/)).toHaveAccessibleDescription(/thinner than a printer can draw/);
    expect(screen.getByRole("img", { name: /Stroboscope disc/ })).toBeInTheDocument();
    expect(screen.queryByRole("link", { name: "Open the PDF" })).not.toBeInTheDocument();
    write(/Other speeds/, "");
    expect(screen.getByRole("link", { name: "Open the PDF" })).toBeInTheDocument();
  });

  it("asks for the frequency of other mains, and for a hole that can be read", async () => {
    renderSheets("?mainsHz=400&speeds=78");
    expect(screen.getByLabelText("Frequency, Hz")).toHaveValue("400");
    write("Frequency, Hz", "401");
    expect(screen.getByLabelText("Frequency, Hz")).toHaveAccessibleDescription(/10 to 400 Hz/);
    expect(screen.getByLabelText("Frequency, Hz")).toBeInvalid();
    write("Frequency, Hz", "16.7");
    write("Hole for the spindle", "50 mm");
    expect(screen.getByLabelText("Hole for the spindle")).toBeInvalid();
  });

  it.each([
    "?mainsHz=9",
    "?mainsHz=fast&speeds=nothing",
    "?sheet=poster&paper=a0&step=7",
    "?spindle=%00&ring=x&count=-",
  ])("opens from %s with a picture", (search) => {
    renderSheets(search);
    expect(screen.getByRole("img", { name: /as it will be printed/ })).toBeInTheDocument();
  });
});

describe("the drift", () => {
  const speed = () => screen.getByRole("heading", { name: "True speed" }).parentElement;

  it("turns counted bars into the true speed, either way round", async () => {
    renderSheets("?mainsHz=60&ring=33+1/3&count=5");
    expect(speed()).toHaveTextContent("33.356 rpm");
    expect(speed()).toHaveTextContent("0.069 % faster than 33 1/3 rpm.");
    await userEvent.selectOptions(screen.getByLabelText("The bars creep"), "back, against the turning");
    expect(speed()).toHaveTextContent("0.069 % slower");
    write("In how many seconds", "30");
    expect(speed()).toHaveTextContent("0.14 % slower");
  });

  it("knows that a ring with an error must creep at the true speed", async () => {
    renderSheets("?mainsHz=50&ring=45&count=15&way=slow");
    expect(speed()).toHaveTextContent("45.000 rpm");
    expect(speed()).toHaveTextContent("Right on 45 rpm.");
    await userEvent.selectOptions(screen.getByLabelText("On the ring for"), "45 rpm: 400 bars, 3 pass at each flash");
    expect(speed()).toHaveTextContent("44.963 rpm");
  });

  it("says what is wrong with a count", () => {
    renderSheets();
    write("Bars counted", "-3");
    expect(screen.getByLabelText("Bars counted")).toHaveAccessibleDescription(/Count from 0/);
    write("Bars counted", "9000");
    expect(screen.getByLabelText("Bars counted")).toHaveAccessibleDescription(/cannot be counted/);
    write("Bars counted", "9");
    write("In how many seconds", "0");
    expect(screen.getByLabelText("In how many seconds")).toBeInvalid();
    expect(speed()).toHaveTextContent("–");
  });
});

describe("the other sheets", () => {
  it("are two pages each", async () => {
    renderSheets("?sheet=ring-gauge&largest=60&step=2");
    expect(screen.getAllByRole("img").map((picture) => picture.textContent?.split(",")[0])).toEqual([
      "Ring gauge",
      "Bore gauge",
    ]);
    expect(`${pdf().pathname}${pdf().search}`).toBe("/api/v1/gauges/sheets/ring-gauge?largestMm=60&stepMm=2&paper=a4");
    await userEvent.click(screen.getByRole("radio", { name: /Belt ruler/ }));
    expect(screen.getAllByRole("img").map((picture) => picture.textContent?.split(",")[0])).toEqual([
      "Belt ruler",
      "Loop gauge",
    ]);
    write("Longest belt, around the inside", "30 in");
    expect(pdf().searchParams.get("longestMm")).toBe("762");
    write("Longest belt, around the inside", "3 m");
    expect(screen.getByLabelText("Longest belt, around the inside")).toBeInvalid();
  });
});
