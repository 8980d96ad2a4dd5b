import { beltRouteLimits } from "#shared/domain/beltRoute";
import { parseLength } from "#shared/domain/length";
import { parseSize } from "#shared/domain/parseSize";
import { storedUnit } from "../../../lib/preferences";
import { readPlainNumber } from "../readPlainNumber";
import { withItsUnit } from "../withItsUnit";
import { beltExamples, pulleysOf } from "./beltExamples";
import { type BeltKind, type BeltState, beltKinds, type NamedPulley, thicknessName } from "./beltState";
import { choicesFor, stretchOf } from "./stretchChoices";

export const longestName = 24;
const number = "-?\\d{1,5}(?:\\.\\d{1,4})?";
const pulleyText = new RegExp(`^(?:(.{1,${longestName}}) )?(${number}) (${number}) (${number})( back)?$`);
const usualThickness: Record<BeltKind, string> = { "flat-belt": "1.2 mm", "square-belt": "3 mm", "round-belt": "3 mm" };

/** "Idler 74 -24 16 back": name (if any), x, y and diameter in mm, and the side where it is the back. */
function readPulley(text: string, id: number): NamedPulley | null {
  const [, name = "", x, y, diameter, back] = pulleyText.exec(text.trim()) ?? [];
  if (diameter === undefined) return null;
  const pulley = { id, name: name.trim(), x: Number(x), y: Number(y), diameter: Number(diameter) };
  const { place, diameter: limits } = beltRouteLimits;
  const isOnBoard = [pulley.x, pulley.y].every((mm) => mm >= place[0] && mm <= place[1]);
  if (!isOnBoard || pulley.diameter < limits[0] || pulley.diameter > limits[1]) return null;
  return { ...pulley, wrap: back ? "back" : "inside" };
}

const shown = (mm: number) => String(Number(mm.toFixed(3)) + 0);
const writePulley = ({ name, x, y, diameter, wrap }: NamedPulley) =>
  [name.trim(), ...[x, y, diameter].map(shown), wrap === "back" ? "back" : ""].filter(Boolean).join(" ");

/** The pulleys of an address; null where one cannot be read, since a belt without it would be another belt. */
function readPulleys(texts: readonly string[]): NamedPulley[] | null {
  const pulleys = texts.map(readPulley);
  const [least, most] = beltRouteLimits.pulleys;
  if (pulleys.length < least || pulleys.length > most) return null;
  return pulleys.every((pulley) => pulley !== null) ? pulleys : null;
}

/**
 * The address: one `pulley` for each in order ("Idler 74 -24 16 back", mm), `kind`, `thickness` or `section`, `width`,
 * `stretch` ("3-6", percent), `of=inside` where it is counted there; and family, shipTo and unit, for the search.
 * What is missing or cannot be read is the worked example's.
 */
export const beltCodec = {
  read(params: URLSearchParams): BeltState {
    const [example] = beltExamples;
    const pulleys = readPulleys(params.getAll("pulley"));
    const kind = beltKinds.find((one) => one === params.get("kind")) ?? "flat-belt";
    const length = (name: string, otherwise: string) => {
      const text = params.get(name)?.trim() ?? "";
      const read = parseSize(text, storedUnit());
      if (!read.ok) return otherwise;
      // Several readings, or a size that was worked out: what they come to.
      return parseLength(text, storedUnit()).ok ? text : `${Number(read.mm.toFixed(3))} mm`;
    };
    const [min = "", max = ""] = (params.get("stretch") ?? "").split("-");
    const isRange = [min, max].every((text) => readPlainNumber(text) !== null);
    const [family, shipTo, unit] = ["family", "shipTo", "unit"].map((name) => params.get(name) ?? "");
    return {
      pulleys: pulleys ?? pulleysOf(example!.rows),
      kind,
      thickness: length(thicknessName(kind), usualThickness[kind]),
      width: length("width", ""),
      ...(isRange
        ? { stretch: { min, max }, isInsideStretch: params.get("of") === "inside" }
        : stretchOf(choicesFor(kind)[0]!)),
      handedOn: {
        ...(family ? { family } : {}),
        ...(shipTo && /^[A-Z]{2}$/.test(shipTo) ? { shipTo } : {}),
        ...(unit === "mm" || unit === "in" ? { unit } : {}),
      },
    };
  },
  write({ pulleys, kind, thickness, width, stretch, isInsideStretch, handedOn }: BeltState): URLSearchParams {
    const unit = handedOn.unit ?? storedUnit();
    const params = new URLSearchParams(pulleys.map((pulley) => ["pulley", writePulley(pulley)]));
    params.set("kind", kind);
    if (thickness.trim()) params.set(thicknessName(kind), withItsUnit(thickness, unit));
    if (kind === "flat-belt" && width.trim()) params.set("width", withItsUnit(width, unit));
    params.set("stretch", `${stretch.min.trim()}-${stretch.max.trim()}`);
    if (isInsideStretch) params.set("of", "inside");
    for (const [name, value] of Object.entries(handedOn)) params.set(name, value);
    return params;
  },
};
