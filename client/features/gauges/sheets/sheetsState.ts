import { recordSpeeds } from "#shared/domain/nominalSpeeds";
import { type Paper, papers } from "#shared/drawing/sheets/papers";
import { ringGaugeSteps } from "#shared/drawing/sheets/ringGaugeSheet";

export const sheetKinds = ["strobe", "ring-gauge", "belt-ruler"] as const;
export type SheetKind = (typeof sheetKinds)[number];
export const mainsChoices = ["50", "60", "other"] as const;
type RecordSpeed = (typeof recordSpeeds)[number];

/** Everything as it was written; what it means is worked out by readSheet and readDrift. */
export type SheetsState = {
  sheet: SheetKind;
  paper: Paper;
  mains: (typeof mainsChoices)[number];
  /** Where `mains` is "other", Hz. */
  mainsHz: string;
  speeds: readonly RecordSpeed[];
  /** Further speeds, commas between. */
  moreSpeeds: string;
  spindle: string;
  largest: string;
  step: (typeof ringGaugeSteps)[number];
  longest: string;
  /** The ring whose bars were counted, by its `ringKey`, and the count. */
  ring: string;
  count: string;
  seconds: string;
  way: "fast" | "slow";
};

/** What the page shows when its address says nothing. */
export const example: SheetsState = {
  sheet: "strobe",
  paper: "a4",
  mains: "50",
  mainsHz: "50",
  speeds: ["16 2/3", "33 1/3", "45", "78"],
  moreSpeeds: "",
  spindle: "7.2 mm",
  largest: "180",
  step: "1",
  longest: "800 mm",
  ring: "33 1/3",
  count: "9",
  seconds: "60",
  way: "fast",
};

const longestText = 100;
const oneOf = <T extends string>(all: readonly T[], text: string | null, otherwise: T): T =>
  all.find((one) => one === text) ?? otherwise;
const paperNames = Object.keys(papers) as Paper[];

function readSpeedTexts(text: string | null): Pick<SheetsState, "speeds" | "moreSpeeds"> {
  if (text === null || text.length > longestText) return { speeds: example.speeds, moreSpeeds: example.moreSpeeds };
  const written = text.split(",").map((piece) => piece.trim());
  const isKnown = (piece: string) => recordSpeeds.some((speed) => speed === piece);
  return {
    speeds: recordSpeeds.filter((speed) => written.includes(speed)),
    moreSpeeds: written.filter((piece) => piece !== "" && !isKnown(piece)).join(", "),
  };
}

/** All the speeds of a disc as one text, as readSpeeds takes it. */
export const speedsText = ({ speeds, moreSpeeds }: Pick<SheetsState, "speeds" | "moreSpeeds">): string =>
  [...speeds, ...(moreSpeeds.trim() === "" ? [] : [moreSpeeds.trim()])].join(",");

function read(params: URLSearchParams): SheetsState {
  const text = (name: "mainsHz" | "spindle" | "largest" | "longest" | "ring" | "count" | "seconds") => {
    const written = params.get(name);
    return written === null || written.length > longestText ? example[name] : written;
  };
  const mainsHz = text("mainsHz");
  return {
    sheet: oneOf(sheetKinds, params.get("sheet"), example.sheet),
    paper: oneOf(paperNames, params.get("paper"), example.paper),
    mains: oneOf(mainsChoices, mainsHz, "other"),
    mainsHz,
    ...readSpeedTexts(params.get("speeds")),
    spindle: text("spindle"),
    largest: text("largest"),
    step: oneOf(ringGaugeSteps, params.get("step"), example.step),
    longest: text("longest"),
    ring: text("ring"),
    count: text("count"),
    seconds: text("seconds"),
    way: oneOf(["fast", "slow"], params.get("way"), example.way),
  };
}

function write(state: SheetsState): URLSearchParams {
  const { sheet, paper, mains, mainsHz, spindle, largest, step, longest, ring, count, seconds, way } = state;
  const own = {
    strobe: {
      mainsHz: mains === "other" ? mainsHz : mains,
      speeds: speedsText(state),
      spindle,
      ring,
      count,
      seconds,
      way,
    },
    "ring-gauge": { largest, step },
    "belt-ruler": { longest },
  };
  return new URLSearchParams({ sheet, paper, ...own[sheet] });
}

/** The state of the page in its address, only what the sheet in hand needs. */
export const sheetsCodec = { read, write };
